import fc from "fast-check";
import { expect } from "vitest";
import type { SectionProperties } from "@/lib/section/properties";
import type { Part } from "@/tests/helpers/drawn-sections";
import { drawingOf, drawn, plate, propertiesOk, sectionOk } from "@/tests/helpers/drawn-sections";
import { expectRel } from "@/tests/helpers/expect-rel";

/** Multiples of a half, which binary numbers hold exactly. */
export const half = (min: number, max: number) =>
  fc.integer({ min: 2 * min, max: 2 * max }).map((n) => n / 2);

const shape: fc.Arbitrary<Part["shape"]> = fc.oneof(
  fc.record({ kind: fc.constant("plate" as const), width: half(10, 200), height: half(4, 60) }),
  fc.record({ kind: fc.constant("round" as const), diameter: half(20, 120) }),
  half(30, 120).map((diameter) => ({ kind: "round" as const, diameter, wall: 5 })),
  half(60, 200).map((depth) => ({
    kind: "profile" as const,
    family: "i-section" as const,
    dimensions: { depth, flangeWidth: 50, webThickness: 6, flangeThickness: 9, rootRadius: 7 },
  })),
);

/** Up to five plates, rounds, tubes and I-sections thrown together, some of them cut-outs. */
export const drawnParts: fc.Arbitrary<readonly Part[]> = fc
  .array(
    fc.record({
      shape,
      x: half(-100, 100),
      y: half(-100, 100),
      angle: fc.constantFrom(0, 90, 180, 30, 45, 17.3),
      cutout: fc.integer({ min: 0, max: 4 }).map((n) => n === 0),
    }),
    { minLength: 1, maxLength: 5 },
  )
  .map((list) =>
    list.map(({ shape: s, x, y, angle, cutout }, i): Part => {
      const part = drawn(`p${i}`, s, x, y, angle);
      const { id, name, at } = part;
      return cutout && i > 0 ? { id, name, at, angle, shape: s, cutout: true } : part;
    }),
  );

/** The properties, or null where the cut-outs leave nothing. */
const left = (list: readonly Part[]): SectionProperties | null => {
  try {
    return propertiesOk(drawingOf(list));
  } catch (thrown) {
    expect(String(thrown)).toMatch(/drawing\.cutAway/);
    return null;
  }
};

const same = (a: SectionProperties, b: SectionProperties, rel: number): void => {
  for (const key of [
    "area",
    "mass",
    "surface",
    "Ix",
    "Iy",
    "I1",
    "I2",
    "Sx",
    "Sy",
    "Zx",
    "Zy",
    "rx",
  ] as const)
    expectRel(a[key], b[key] ?? Number.NaN, { rel, name: key });
  expectRel(a.Ixy, b.Ixy, { rel, scale: b.I1, name: "Ixy" });
  expectRel(a.perimeter.outer, b.perimeter.outer, { rel, name: "perimeter" });
  expect(a.warnings.map(({ code }) => code).toSorted()).toEqual(
    b.warnings.map(({ code }) => code).toSorted(),
  );
};

/** A coordinate near 1e6 mm is kept to 1.2e-10 mm: on the least size drawn here, 4 mm, 3e-11, with room for sums. */
const FAR_REL = 1e-9;

/** A drawing moved by (2dx, 2dy) has the same properties. */
export const staysWhenMoved = (list: readonly Part[], dx: number, dy: number): void => {
  const here = left(list);
  if (here === null) return;
  const moved = list.map((part) => ({ ...part, at: { x: part.at.x + 2 * dx, y: part.at.y + 2 * dy } }));
  same(propertiesOk(drawingOf(moved)), here, FAR_REL);
};

/** The order of parts changes no property, and no part. */
export const staysWhenMixed = (list: readonly Part[], seed: number): void => {
  const here = left(list);
  if (here === null) return;
  const mixed = list
    .map((part, i) => ({ part, key: Math.sin(seed + 7 * i) }))
    .toSorted((a, b) => a.key - b.key)
    .map(({ part }) => part);
  same(propertiesOk(drawingOf(mixed)), here, 1e-9);
  const ids = (of: readonly Part[]) => sectionOk(drawingOf(of)).parts.map(({ id }) => id);
  expect(ids(mixed).toSorted()).toEqual(ids(list).toSorted());
};

/** A plate cut in two across, at n twentieths of its width, is the same section in one body. */
export const staysWhenCut = (width: number, height: number, turn: number, n: number): void => {
  const whole = propertiesOk(drawingOf([plate("p", 40, 50, width, height, turn)]));
  const cut = (width * n) / 20;
  const [c, s] = [Math.cos((turn * Math.PI) / 180), Math.sin((turn * Math.PI) / 180)];
  const at = (along: number): [number, number] => [40 + c * along, 50 + s * along];
  const halves = drawingOf([
    plate("a", ...at((cut - width) / 2), cut, height, turn),
    plate("b", ...at(cut / 2), width - cut, height, turn),
  ]);
  const { area, Ix, Iy, I1, Zx, perimeter } = propertiesOk(halves);
  expectRel(area, whole.area, { rel: 1e-12 });
  expectRel(Ix, whole.Ix, { rel: 1e-11, scale: I1 });
  expectRel(Iy, whole.Iy, { rel: 1e-11, scale: I1 });
  expectRel(Zx, whole.Zx ?? Number.NaN, { rel: 1e-9 });
  expectRel(perimeter.outer, whole.perimeter.outer, { rel: 1e-12 });
  expect(sectionOk(halves).bodies).toEqual([["a", "b"]]);
};
