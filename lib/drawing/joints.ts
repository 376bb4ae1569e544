import type { Drawing, DrawingJoint } from "@/lib/drawing/schema";

export const JOINT_KINDS = [
  "fillet",
  "cjp",
  "pjp",
  "bolts",
  "none",
] as const satisfies readonly DrawingJoint["kind"][];

/** The joint of a pair of parts changed, or written down where there was none (a fillet weld without a size). */
export const changeJoint = (
  drawing: Drawing,
  pair: readonly [string, string],
  change: Partial<DrawingJoint>,
): Drawing => {
  const found = drawing.joints.findIndex((j) => pair.every((id) => j.between.includes(id)));
  const before: DrawingJoint = drawing.joints[found] ?? { between: [...pair], kind: "fillet", size: null };
  const after: DrawingJoint = { ...before, ...change };
  return {
    ...drawing,
    joints: found < 0 ? [...drawing.joints, after] : drawing.joints.map((j, i) => (i === found ? after : j)),
  };
};
