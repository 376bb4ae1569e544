import type { Ring, Vertex } from "@/lib/geometry/region";
import { err, ok, type Result } from "@/lib/result";

/** A corner of an outline with the radius that rounds it (mm, 0 is sharp) and the dimension that gives this radius. */
export type Corner = Readonly<{ x: number; y: number; radius?: number; field?: string }>;

/** Share of an edge by which two roundings may overlap before they are refused: rounding of inch sizes, no more. */
const FIT_REL = 1e-9;

type Rounding = Readonly<{ start: Vertex; end: Vertex; reach: number }>;

const roundingAt = (before: Corner, at: Corner, after: Corner): Rounding => {
  const inLength = Math.hypot(at.x - before.x, at.y - before.y);
  const outLength = Math.hypot(after.x - at.x, after.y - at.y);
  const [ix, iy] = [(at.x - before.x) / inLength, (at.y - before.y) / inLength];
  const [ox, oy] = [(after.x - at.x) / outLength, (after.y - at.y) / outLength];
  const turn = Math.atan2(ix * oy - iy * ox, ix * ox + iy * oy);
  const reach = (at.radius ?? 0) * Math.abs(Math.tan(turn / 2));
  return {
    start: { x: at.x - ix * reach, y: at.y - iy * reach, bulge: Math.tan(turn / 4) },
    end: { x: at.x + ox * reach, y: at.y + oy * reach },
    reach,
  };
};

/**
 * The ring through these corners, each rounded by an arc that touches both of its edges.
 * @param corners n ≥ 3, mm, in the order of the ring; no two that follow each other coincide.
 * @returns a ring of lines and arcs, or `profile.doesNotFit` with a JSON pointer to the radius that is too large for its
 * edge.
 * @source Plane geometry: with turn φ the arc starts r·tan(φ/2) before the corner and has bulge tan(φ/4).
 */
export const roundedRing = (corners: readonly Corner[]): Result<Ring> => {
  const n = corners.length;
  const around = corners.map((at, i) => ({
    at,
    before: corners[(i + n - 1) % n] ?? at,
    after: corners[(i + 1) % n] ?? at,
  }));
  const roundings = around.map(({ before, at, after }) => roundingAt(before, at, after));
  const ring: Vertex[] = [];
  for (const [i, { at, after }] of around.entries()) {
    const [here, next] = [roundings[i], roundings[(i + 1) % n]];
    if (here === undefined || next === undefined) continue;
    const edge = Math.hypot(after.x - at.x, after.y - at.y);
    const spare = edge - here.reach - next.reach;
    if (spare < -FIT_REL * edge) {
      const field = (here.reach >= next.reach ? at.field : after.field) ?? at.field ?? after.field ?? "";
      return err({
        code: "profile.doesNotFit",
        detail: `The ${field} is too large for the edge it rounds: make it smaller, or check the other dimensions.`,
        pointer: `/dimensions/${field}`,
      });
    }
    const [start, end] = [here.start, here.end];
    ring.push(here.reach > 0 ? start : { x: at.x, y: at.y });
    if (here.reach > 0 && spare > FIT_REL * edge) ring.push(end);
  }
  return ok(ring);
};
