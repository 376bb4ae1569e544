import { describe, expect, test } from "vitest";
import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { jointForces, type JointForce } from "@/lib/section/joint-forces";
import { sectionProperties } from "@/lib/section/section-properties";
import { steelDrawing } from "@/tests/helpers/steel-drawing";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";

const section = (drawing: Drawing) => {
  const result = sectionOf(drawing);
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};

const plate = (width: number, height: number, x: number, y: number, angle = 0) => ({
  shape: { kind: "plate" as const, width, height },
  at: { x, y },
  angle,
});

/** Closed forms over rectangles: rounding, and the 1e-10 that noding may move a corner by on 100 mm. */
const CLOSE = { rel: 1e-10 };

const between = (forces: readonly JointForce[], a: string, b: string): JointForce => {
  const found = forces.filter((f) => f.parts.includes(a) && f.parts.includes(b));
  if (found.length !== 1) throw new Error(`${found.length} joints between ${a} and ${b}`);
  return found[0] as JointForce;
};

describe("a plate girder", () => {
  // p1 top flange, p2 web, p3 bottom flange.
  const drawing = steelDrawing(plate(250, 15, 0, 1237.5), plate(10, 1200, 0, 630), plate(450, 30, 0, 15));
  const girder = section(drawing);
  const p = must(sectionProperties(girder));
  const forces = jointForces(girder);

  test("has VQ/I in the line between flange and web", () => {
    const top = between(forces, "p1", "p2");
    const Q = 250 * 15 * (1237.5 - p.centroid.y);
    expectRel(Math.abs(top.perVy ?? Number.NaN), Q / p.Ix, CLOSE);
    expectRel(top.width, 10, CLOSE);
    expectRel(top.perVx, 0, { ...CLOSE, scale: Q / p.Ix });
    const bottom = between(forces, "p2", "p3");
    expectRel(Math.abs(bottom.perVy ?? Number.NaN), (450 * 30 * (p.centroid.y - 15)) / p.Ix, CLOSE);
  });

  test("names the parts beyond the line, whose pull is positive", () => {
    const top = between(forces, "p1", "p2");
    expect(top.beyond).toEqual(top.parts[1] === "p1" ? ["p1"] : ["p2", "p3"]);
    // The forces on both sides of a line are equal and opposite: the top flange lies above the centroid.
    const sign = top.beyond.includes("p1") ? 1 : -1;
    expect(Math.sign(top.perVy ?? 0)).toBe(sign);
    expect(top.absent).toBeNull();
  });
});

test("bends freely: a zee of three plates has the flow of both bending components in its joints", () => {
  const [h, b, t] = [200, 90, 15];
  const zee = section(
    steelDrawing(
      plate(t, h, 0, 0),
      plate(b - t, t, b / 2, (h - t) / 2),
      plate(b - t, t, -b / 2, (t - h) / 2),
    ),
  );
  const { Ix, Iy, Ixy } = must(sectionProperties(zee));
  const D = Ix * Iy - Ixy ** 2;
  const [Qx, Qy] = [(b - t) * t * ((h - t) / 2), (b - t) * t * (b / 2)];
  const top = between(jointForces(zee), "p1", "p2");
  const sign = top.beyond.includes("p2") ? 1 : -1;
  expectRel(sign * (top.perVy ?? Number.NaN), (Iy * Qx - Ixy * Qy) / D, CLOSE);
  expectRel(sign * (top.perVx ?? Number.NaN), (Ix * Qy - Ixy * Qx) / D, CLOSE);
});

test("a box of four plates is a closed cell: its joints are absent with the reason, the fin outside it is not", () => {
  const box = section(
    steelDrawing(
      plate(400, 20, 0, 410),
      plate(400, 20, 0, -10),
      plate(10, 400, -150, 200),
      plate(10, 400, 150, 200),
      plate(12, 100, 0, 470),
    ),
  );
  const forces = jointForces(box);
  expect(forces).toHaveLength(5);
  for (const [a, b] of [
    ["p1", "p3"],
    ["p1", "p4"],
    ["p2", "p3"],
    ["p2", "p4"],
  ] as const) {
    const joint = between(forces, a, b);
    expect([joint.perVx, joint.perVy, joint.absent?.code]).toEqual([null, null, "joint.closedCell"]);
  }
  const fin = between(forces, "p1", "p5");
  const p = must(sectionProperties(box));
  expectRel(Math.abs(fin.perVy ?? Number.NaN), (12 * 100 * (470 - p.centroid.y)) / p.Ix, CLOSE);
});

test("two seams between the same two parts close a cell too", () => {
  const channelOnPlate = section(
    steelDrawing(
      {
        shape: {
          kind: "profile",
          family: "channel",
          dimensions: { depth: 200, flangeWidth: 75, webThickness: 8, flangeThickness: 11, rootRadius: 0 },
        },
      },
      plate(10, 260, 42.5, 0),
    ),
  );
  const forces = jointForces(channelOnPlate);
  expect(forces).toHaveLength(2);
  for (const joint of forces) {
    expectRel(joint.width, 11, CLOSE);
    expect(joint.absent?.code).toBe("joint.closedCell");
  }
});

test("a part that a cut-out parts in two belongs to both sides with its pieces", () => {
  const drawing = steelDrawing(plate(200, 20, 0, 210), plate(10, 400, 0, 0), plate(200, 20, 0, -210));
  const parted = section({
    ...drawing,
    parts: [
      ...drawing.parts,
      {
        id: "c1",
        name: "Slot",
        cutout: true,
        at: { x: 0, y: 0 },
        angle: 0,
        shape: { kind: "plate", width: 40, height: 40 },
      },
    ],
  });
  for (const joint of jointForces(parted)) expect(joint.absent?.code).toBe("section.notConnected");
});

test("a web parted by a slot and bridged by one plate has a line on each side of it, and the plate is in equilibrium", () => {
  const drawing = steelDrawing(
    plate(200, 20, 0, 210),
    plate(10, 400, 0, 0),
    plate(200, 20, 0, -210),
    plate(12, 300, 11, 0),
  );
  const bridged = section({
    ...drawing,
    parts: [
      ...drawing.parts,
      {
        id: "c1",
        name: "Slot",
        cutout: true,
        at: { x: 0, y: 20 },
        angle: 0,
        shape: { kind: "plate", width: 10, height: 40 },
      },
    ],
  });
  const p = must(sectionProperties(bridged));
  const seams = jointForces(bridged).filter((j) => j.parts.includes("p4"));
  expect(seams).toHaveLength(2);
  expect(seams.map((j) => j.absent)).toEqual([null, null]);
  // Towards the plate at one seam lies everything else: its pull at both, seen from the plate, is the plate's own flow.
  const D = p.Ix * p.Iy - p.Ixy ** 2;
  const [x, y] = [11 - p.centroid.x, -p.centroid.y];
  const own = (3600 * (p.Iy * y - p.Ixy * x)) / D;
  const intoPlate = seams.map((j) => (j.parts[1] === "p4" ? 1 : -1) * (j.perVy ?? Number.NaN));
  expectRel((intoPlate[0] ?? 0) + (intoPlate[1] ?? 0), own, { ...CLOSE, scale: Math.abs(intoPlate[0] ?? 0) });
  expectRel(
    seams.reduce((sum, j) => sum + j.width, 0),
    300 - 40,
    CLOSE,
  );
});

test("parts that do not touch have no joints", () => {
  expect(jointForces(section(steelDrawing(plate(10, 10, 0, 0), plate(10, 10, 50, 0))))).toEqual([]);
});
