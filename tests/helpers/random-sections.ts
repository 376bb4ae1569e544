import fc from "fast-check";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { STEEL } from "@/tests/helpers/sections";

const plate = (
  id: string,
  x: number,
  y: number,
  angle: number,
  width: number,
  height: number,
): DrawingPart => ({
  id,
  name: id,
  material: "steel",
  at: { x, y },
  angle,
  shape: { kind: "plate", width, height },
});

const drawingOf = (parts: readonly DrawingPart[]): Drawing => ({
  version: 1,
  unit: "mm",
  reference: "steel",
  materials: [STEEL],
  parts: [...parts],
  joints: [],
});

const length = fc.integer({ min: 60, max: 900 });
const thickness = fc.integer({ min: 5, max: 60 });
const grow = fc.record({
  length,
  thickness,
  at: fc.double({ min: 0, max: 1, noNaN: true }),
  side: fc.boolean(),
});

/** Plates welded one to the other at right angles, each standing on a side of the one before it. */
const plateTree = fc.array(grow, { minLength: 2, maxLength: 6 }).map((plates) => {
  const parts: DrawingPart[] = [];
  let [x, y, along] = [0, 0, true];
  plates.forEach(({ length: l, thickness: t, at, side }, i) => {
    parts.push(plate(`p${i}`, x, y, 0, along ? l : t, along ? t : l));
    const next = plates[i + 1];
    if (next === undefined) return;
    const sign = side ? 1 : -1;
    const slide = (at - 0.5) * (l - next.thickness);
    const away = (sign * (t + next.length)) / 2;
    x += along ? slide : away;
    y += along ? away : slide;
    along = !along;
  });
  return drawingOf(parts);
});

/** Plates crossing in one point at several angles. */
const star = fc
  .array(fc.record({ length, thickness, turn: fc.integer({ min: 25, max: 90 }) }), {
    minLength: 2,
    maxLength: 4,
  })
  .map((arms) => {
    let angle = 0;
    return drawingOf(
      arms.map(({ length: l, thickness: t, turn }, i) => {
        angle += turn;
        return plate(`a${i}`, 0, 0, angle % 180, l, Math.min(t, l / 3));
      }),
    );
  });

/** A plate or round with a hole off its middle. */
const holed = fc
  .record({
    width: length,
    height: length,
    share: fc.double({ min: 0.1, max: 0.8, noNaN: true }),
    round: fc.boolean(),
  })
  .map(({ width, height, share, round }) => {
    const size = share * Math.min(width, height);
    const x = 0.4 * (width - size) * (share - 0.5);
    const hole: DrawingPart = {
      id: "hole",
      name: "hole",
      cutout: true,
      at: { x, y: 0 },
      angle: 0,
      shape: round ? { kind: "round", diameter: size } : { kind: "plate", width: size, height: size },
    };
    return drawingOf([plate("p", 0, 0, 0, width, height), hole]);
  });

/** Overlapping plates turned anyhow, counted once where they overlap. */
const union = fc
  .array(
    fc.record({
      length,
      height: fc.integer({ min: 30, max: 400 }),
      angle: fc.integer({ min: 0, max: 179 }),
      dx: fc.integer({ min: -20, max: 20 }),
      dy: fc.integer({ min: -20, max: 20 }),
    }),
    { minLength: 2, maxLength: 4 },
  )
  .map((plates) =>
    drawingOf(
      plates.map(({ length: l, height, angle, dx, dy }, i) => plate(`u${i}`, dx, dy, angle, l, height)),
    ),
  );

/** Random connected sections: plate trees, stars, plates with holes, unions of turned plates. */
export const connectedSection: fc.Arbitrary<Drawing> = fc.oneof(plateTree, star, holed, union);
