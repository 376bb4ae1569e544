import { expect } from "vitest";
import { perimeterOf } from "@/lib/geometry/perimeter";
import { nodeParts, regionsOfParts } from "@/lib/geometry/noding";
import type { Region } from "@/lib/geometry/region";
import { alignEdges } from "@/lib/geometry/shared-edges";
import { TOUCH_MM } from "@/lib/geometry/tolerance";
import { edgeLength } from "@/lib/geometry/arc";
import type { TouchingPlates } from "@/tests/helpers/assemblies";
import { expectRel } from "@/tests/helpers/expect-rel";
import { areaOf, arranged, cutoutOf, partOf } from "@/tests/helpers/parts";

/** Rounding of the placement (1e-12 mm on 5 m) over the least plate (3 mm), with room for sums. */
const TOUCH_REL = 1e-11;

/** Touching plates are one body with one outline without a crack, and touch over their whole common length. */
export const holdsTogether = ({ plates, contact, area, perimeter }: TouchingPlates): void => {
  const { outline, bodies, contacts, warnings } = arranged(plates.map((p, i) => partOf(`p${i}`, [p])));
  expect(bodies).toEqual([[0, 1]]);
  expect(warnings).toEqual([]);
  expect(outline.map(({ holes }) => holes.length)).toEqual([0]);
  expectRel(areaOf(outline), area, { rel: TOUCH_REL, name: "area" });
  expectRel(perimeterOf(outline).outer, perimeter, { rel: TOUCH_REL, name: "perimeter" });
  const touching = contacts.flatMap(({ lines }) => lines);
  expectRel(
    touching.reduce((sum, { from, to }) => sum + edgeLength(from, to), 0),
    contact,
    { rel: 1e-9, name: "contact" },
  );
};

const IDENTITY_REL = 1e-9;

/** The areas of two regions once they are noded against each other; noding moves no boundary by more than TOUCH_MM. */
const nodedAreas = (a: Region, b: Region): number[] =>
  regionsOfParts(alignEdges(nodeParts([[a], [b]])), 2).map((noded, i) => {
    const drawn = [i === 0 ? a : b];
    const { outer, inner } = perimeterOf(drawn);
    const area = areaOf(noded);
    expect(Math.abs(area - areaOf(drawn)), "moved by noding").toBeLessThanOrEqual(
      TOUCH_MM * (outer + inner) + IDENTITY_REL * area,
    );
    return area;
  });

/** |A∪B| + |A∩B| = |A| + |B| of two noded regions, the union and A∖B each found by an arrangement of its own. */
export const addsUp = (a: Region, b: Region): void => {
  const union = areaOf(arranged([partOf("a", [a]), partOf("b", [b])]).outline);
  const rest = areaOf(arranged([partOf("a", [a])], [cutoutOf("b", [b])]).outline);
  const [areaA = 0, areaB = 0] = nodedAreas(a, b);
  expectRel(union + (areaA - rest), areaA + areaB, { rel: IDENTITY_REL });
};

const namedParts = (regions: readonly Region[]) => regions.map((region, i) => partOf(`p${i}`, [region]));

/** The parts of an assembly no longer overlap and fill their outline. */
export const fillsItsOutline = (regions: readonly Region[]): void => {
  const { parts: settled, outline } = arranged(namedParts(regions));
  expectRel(
    settled.reduce((sum, list) => sum + areaOf(list), 0),
    areaOf(outline),
    { rel: IDENTITY_REL, name: "sum of parts" },
  );
};

/** What becomes of an assembly does not depend on the order of its parts. */
export const sameInAnyOrder = (regions: readonly Region[]): void => {
  const parts = namedParts(regions);
  const { parts: settled, outline, bodies } = arranged(parts);
  const area = areaOf(outline);
  const turned = arranged(parts.toReversed());
  expectRel(areaOf(turned.outline), area, { rel: IDENTITY_REL, name: "other order" });
  turned.parts.toReversed().forEach((list, i) =>
    expectRel(areaOf(list), areaOf(settled[i] ?? []), {
      rel: IDENTITY_REL,
      scale: area,
      name: `part ${i}`,
    }),
  );
  expect(turned.bodies.length).toBe(bodies.length);
};
