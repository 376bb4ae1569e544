import { describe, expect, test } from "vitest";
import { nodeParts, regionsOfParts } from "@/lib/geometry/noding";
import { alignEdges, edgeGroups } from "@/lib/geometry/shared-edges";
import { TOUCH_MM } from "@/lib/geometry/tolerance";
import { expectRel } from "@/tests/helpers/expect-rel";
import { areaOf, disc, put, rectangle } from "@/tests/helpers/parts";

describe("nodeParts", () => {
  test("vertices within the tolerance become one node between them; further off they stay apart", () => {
    const gap = (by: number) => nodeParts([[rectangle(10, 10)], [put(rectangle(10, 10), 10 + by, 0)]]);
    const near = gap(0.8 * TOUCH_MM);
    expect(near.nodes).toHaveLength(6);
    expect(near.partsAt.filter((parts) => parts.length === 2)).toHaveLength(2);
    expectRel(Math.max(...near.nodes.filter(({ x }) => x < 10).map(({ x }) => x)), 5 + 0.4 * TOUCH_MM, {
      rel: 1e-12,
    });
    expect(gap(1.2 * TOUCH_MM).nodes).toHaveLength(8);
  });

  test("an edge is split where another part's vertex lies on it, an arc too, and keeps its shape", () => {
    const [bar, plate] = [disc(50), put(rectangle(20, 10), 60, 0)];
    const { rings, nodes } = nodeParts([[bar], [plate]]);
    expect(rings.map(({ edges }) => edges.length)).toEqual([2, 5]);
    expect(nodes).toHaveLength(6);
    const wedge = {
      outer: [
        { x: 0, y: 0 },
        { x: 30, y: -40, bulge: 0.2 },
        { x: 30, y: 40 },
      ],
      holes: [],
    };
    const noded = nodeParts([[bar], [wedge]]);
    expect(noded.rings[0]?.edges).toHaveLength(4);
    expectRel(areaOf(regionsOfParts(noded, 2)[0] ?? []), Math.PI * 2500, { rel: 1e-14 });
  });

  test("parts that come near no other keep every bit", () => {
    const parts = [[put(disc(7, 3), 1 / 3, 1 / 7, 11)], [put(rectangle(3, 4), 500, 1 / 3, 29)]];
    expect(regionsOfParts(nodeParts(parts), 2)).toEqual(parts);
  });

  test("a part that shrinks into another's vertex is left out", () => {
    const speck = put(rectangle(TOUCH_MM / 4, TOUCH_MM / 4), 5, 5);
    expect(regionsOfParts(nodeParts([[rectangle(10, 10)], [speck]]), 2)[1]).toEqual([]);
  });
});

test("edges that run along each other within the tolerance get one curve", () => {
  const upper = (bulge: number) => ({
    outer: [
      { x: 10, y: 0 },
      { x: 10, y: 10 },
      { x: 0, y: 10 },
      { x: 0, y: 0, bulge },
    ],
    holes: [],
  });
  const lower = {
    outer: [
      { x: 0, y: 0 },
      { x: 0, y: -10 },
      { x: 10, y: -10 },
      { x: 10, y: 0 },
    ],
    holes: [],
  };
  const groupsOf = (bulge: number) => {
    const aligned = alignEdges(nodeParts([[upper(bulge)], [lower]]));
    return edgeGroups(aligned).filter((group) => group.length > 1);
  };
  const [pair] = groupsOf(1e-6);
  expect(pair?.map(({ edge }) => edge.bulge)).toEqual([5e-7, -5e-7]);
  expect(groupsOf(1e-2)).toEqual([]);
});
