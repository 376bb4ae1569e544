import type { Point, Ring } from "@/lib/geometry/region";
import type { Contact, ContactLine } from "@/lib/section/section";
import type { DrawingJoint } from "@/lib/drawing/schema";
import type { FigureItem } from "@/lib/figure/display-list";
import { chordsOf, insideChords } from "@/lib/figure/outline";

type WeldItem = Extract<FigureItem, { kind: "weld" }>;
type Loops = readonly (readonly Point[])[];

const joined = (joint: DrawingJoint, pair: readonly [string, string]) =>
  joint.between.includes(pair[0]) && joint.between.includes(pair[1]);

/** The joint written for a pair of parts, in either order. */
export const jointOf = (
  joints: readonly DrawingJoint[],
  pair: readonly [string, string],
): DrawingJoint | undefined => joints.find((j) => joined(j, pair));

/**
 * A weld mark in each inner corner where one part ends on the face of another. Joints that are bolted or "none" get no
 * mark; a weld without a size is drawn open.
 */
export const weldMarks = (
  contacts: readonly Contact[],
  joints: readonly DrawingJoint[],
  ringsOf: (part: string) => readonly Ring[],
): WeldItem[] => {
  const loops = new Map<string, Loops>();
  const loopsOf = (part: string): Loops => {
    const known = loops.get(part);
    if (known) return known;
    const made = ringsOf(part).map((r) => chordsOf(r));
    loops.set(part, made);
    return made;
  };
  return contacts.flatMap((contact) => {
    const joint = jointOf(joints, contact.parts);
    if (joint && (joint.kind === "none" || joint.kind === "bolts")) return [];
    const sides = contact.parts.map(loopsOf);
    return contact.lines
      .filter((l) => !l.bulge)
      .flatMap((l) => [...cornerAt(l, 1, sides), ...cornerAt(l, -1, sides)])
      .map((c) => ({
        ...c,
        kind: "weld" as const,
        sized: (joint?.size ?? null) !== null || joint?.kind === "cjp",
      }));
  });
};

const cornerAt = (
  line: ContactLine,
  end: 1 | -1,
  sides: readonly Loops[],
): Pick<WeldItem, "at" | "along" | "out">[] => {
  const [from, at] = end === 1 ? [line.from, line.to] : [line.to, line.from];
  const length = Math.hypot(at.x - from.x, at.y - from.y);
  if (length === 0) return [];
  const along = { x: (at.x - from.x) / length, y: (at.y - from.y) / length };
  const step = Math.min(length * 0.02, 0.5);
  return ([1, -1] as const).flatMap((side) => {
    const out = { x: -along.y * side, y: along.x * side };
    const beside = (s: number) => ({
      x: at.x + (along.x + out.x * s) * step,
      y: at.y + (along.y + out.y * s) * step,
    });
    const filled = (p: Point) => sides.some((loops) => insideChords(loops, p));
    return !filled(beside(1)) && filled(beside(-1)) ? [{ at, along, out }] : [];
  });
};
