import type { Point } from "@/lib/geometry/region";
import type { JointForce } from "@/lib/section/joint-forces";
import type { JointFlow } from "@/lib/section/torsion/joint-flows";

/** The ends of a line found by the mesh lie on the drawn line to this length, mm: vertices merge within 1e-4. */
const SAME_PLACE_MM = 1e-3;

const near = (p: Point, q: Point): boolean => Math.hypot(p.x - q.x, p.y - q.y) <= SAME_PLACE_MM;

const isPart = (force: JointForce, flow: JointFlow): boolean => {
  const [a, b] = flow.parts;
  if (!force.parts.includes(a) || !force.parts.includes(b)) return false;
  return force.lines.some(({ from, to }) => [from, to].some((p) => near(p, flow.from) || near(p, flow.to)));
};

/**
 * Joint forces with those in closed cells taken from the shear solution.
 * @param forces of `jointForces`; those known from statics are returned as they are.
 * @param flows of `solveTorsion` for the same section (ν = 0).
 * @returns for a line of a closed cell the force per mm of member for 1 N through the shear centre, positive when it pulls
 * the second of `parts` forward, which alone is named in `beyond`; a line without a flow keeps its reason.
 */
export const jointForcesInCells = (
  forces: readonly JointForce[],
  flows: readonly JointFlow[],
): readonly JointForce[] =>
  forces.map((force) => {
    if (force.absent?.code !== "joint.closedCell") return force;
    const [, second] = force.parts;
    const own = flows.filter((flow) => isPart(force, flow));
    if (own.length === 0) return force;
    const signed = own.map((flow) => ({ flow, sign: flow.parts[0] === second ? 1 : -1 }));
    return {
      ...force,
      beyond: [second],
      perVx: signed.reduce((sum, { flow, sign }) => sum + sign * flow.perVx, 0),
      perVy: signed.reduce((sum, { flow, sign }) => sum + sign * flow.perVy, 0),
      absent: null,
    };
  });
