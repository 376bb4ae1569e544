type HollowAsk = Readonly<{
  /** Wall, mm; `outer` and `inner` corner radii where the table prints them. */
  thickness: number;
  standard: string;
  us: boolean;
  outer: number | null;
  inner: number | null;
}>;

export type HollowRadii = Readonly<{ outer: number; inner: number; built: string }>;

/** EN 10210-2: outer 1.5 T, inner 1.0 T. */
const hot = (t: number) => ({ outer: 1.5 * t, inner: t });

/** EN 10219-2: 2.0 T / 1.0 T up to 6 mm, 2.5 T / 1.5 T up to 10 mm, 3.0 T / 2.0 T above. */
const cold = (t: number) =>
  t <= 6
    ? { outer: 2 * t, inner: t }
    : t <= 10
      ? { outer: 2.5 * t, inner: 1.5 * t }
      : { outer: 3 * t, inner: 2 * t };

/** US HSS (A500): 2 t and t of the design wall reproduce the printed A, I, Z. */
const usTube = (t: number) => ({ outer: 2 * t, inner: t });

/**
 * Corner radii of a rectangular hollow section, mm: as printed, else by the rule of its standard.
 * @returns null when neither is known. @source EN 10210-2 and EN 10219-2, annexes with formulas for calculation.
 */
export function hollowRadii({ thickness, standard, us, outer, inner }: HollowAsk): HollowRadii | null {
  const rule = /10210/.test(standard)
    ? { ...hot(thickness), name: "EN 10210-2" }
    : /10219/.test(standard)
      ? { ...cold(thickness), name: "EN 10219-2" }
      : us
        ? { ...usTube(thickness), name: "2 t and t of the design wall (A500)" }
        : null;
  if (outer !== null && inner !== null) return { outer, inner, built: "" };
  if (outer !== null) {
    const byRule = rule !== null && Math.abs(rule.outer - outer) <= 0.02 * outer;
    const ratio =
      Math.abs(outer - 1.5 * thickness) <= 0.02 * outer ? thickness : Math.max(0, outer - thickness);
    return byRule
      ? { outer, inner: rule.inner, built: `inner radius by ${rule.name}` }
      : { outer, inner: ratio, built: "inner radius from the outer radius and the wall" };
  }
  return rule === null ? null : { outer: rule.outer, inner: rule.inner, built: `radii by ${rule.name}` };
}
