/** A function value with its slope. */
export type ValueAndSlope = Readonly<{ value: number; slope: number }>;

/** Newton steps and halvings allowed; 200 halvings pass below the spacing of doubles from any bracket. */
const MAX_STEPS = 200;

/**
 * Root of an increasing (not strictly) function inside a bracket: Newton's step where it stays inside and at least halves
 * the last one, else the middle of the bracket.
 * @param at value and slope at d; at(low) ≤ 0 ≤ at(high).
 * @param near the search ends when the bracket or the step is this small.
 * @source Safeguarded Newton iteration, as in any text of numerical analysis.
 */
export const bracketedRoot = (
  at: (d: number) => ValueAndSlope,
  low: number,
  high: number,
  near: number,
): number => {
  let [a, b] = [low, high];
  let d = (a + b) / 2;
  let lastStep = b - a;
  for (let i = 0; i < MAX_STEPS; i += 1) {
    const { value, slope } = at(d);
    if (value === 0) return d;
    if (value < 0) a = d;
    else b = d;
    const newton = slope > 0 ? d - value / slope : NaN;
    const usable = newton > a && newton < b && Math.abs(newton - d) <= lastStep / 2;
    const next = usable ? newton : (a + b) / 2;
    lastStep = Math.abs(next - d);
    d = next;
    if (b - a <= near || lastStep <= near) return d;
  }
  return d;
};
