import { clipToHalfPlane, type CutSegment, type HalfPlane } from "@/lib/geometry/clip-half-plane";
import { nearestRegion } from "@/lib/geometry/boundary-distance";
import { ringContains } from "@/lib/geometry/contains";
import { edgeOf, directionAt, pointOnEdge, ringEdges } from "@/lib/geometry/edge";
import { addMoments, NO_MOMENTS, regionMoments, type Moments } from "@/lib/geometry/moments";
import type { Point, Region } from "@/lib/geometry/region";
import { err, ok, type Fault, type Result } from "@/lib/result";
import { elasticOf, type ElasticValues } from "@/lib/section/elastic";
import { everyNumberIsFinite } from "@/lib/section/finite";
import { rearranged } from "@/lib/section/rearrange";
import type { Section } from "@/lib/section/section";
import { modularRatio, stiffParts, weightedBy } from "@/lib/section/stiffness";
import { stressGrowth } from "@/lib/section/unit-shear";

/**
 * One connected piece that a cut takes off. `area` (transformed, mm²); `Qx` = ∫n·y dA and `Qy` = ∫n·x dA about the
 * centroid of the whole section (mm³); `perVx`, `perVy` the shear flow through the cut into the piece for a shear of 1 N
 * through the shear centre (1/mm: N per mm of member); `segments` where the cut goes through material and their `length`
 * (mm); `meanPerVx`, `meanPerVy` = flow / length, the mean shear stress per N (1/mm²), null where the cut has no length.
 * With more than one segment only the sum over them is statics: `shared` is then true.
 */
export type CutPiece = Readonly<{
  area: number;
  Qx: number;
  Qy: number;
  perVx: number;
  perVy: number;
  segments: readonly CutSegment[];
  length: number;
  meanPerVx: number | null;
  meanPerVy: number | null;
  shared: boolean;
}>;

const lengthOf = ({ from, to }: CutSegment): number => Math.hypot(to.x - from.x, to.y - from.y);

/** A segment shortened to what lies in a half-plane, or none. */
const trimmed = ({ from, to }: CutSegment, { normal, offset }: HalfPlane): readonly CutSegment[] => {
  const h = (p: Point) => p.x * normal.x + p.y * normal.y - offset;
  const [a, b] = [h(from), h(to)];
  if (a > 0 && b > 0) return [];
  const at = a / (a - b);
  const crossing = { x: from.x + at * (to.x - from.x), y: from.y + at * (to.y - from.y) };
  return [a > 0 ? { from: crossing, to } : b > 0 ? { from, to: crossing } : { from, to }];
};

type Clip = Readonly<{ regions: readonly Region[]; segments: readonly CutSegment[] }>;

const clipAll = (regions: readonly Region[], halfPlanes: readonly HalfPlane[]): Result<Clip> => {
  let left: Clip = { regions, segments: [] };
  for (const halfPlane of halfPlanes) {
    const next = clipToHalfPlane(left.regions, halfPlane);
    if (!next.ok) return err(next.error);
    left = {
      regions: next.value.regions,
      segments: [...left.segments.flatMap((one) => trimmed(one, halfPlane)), ...next.value.segments],
    };
  }
  return ok(left);
};

const badHalfPlane = ({ normal, offset }: HalfPlane): boolean =>
  !(Math.abs(Math.hypot(normal.x, normal.y) - 1) <= 1e-9) || !Number.isFinite(offset);

/** A point just inside a region: beside the middle of its longest edge. */
const innerPoint = ({ outer }: Region): Point => {
  const edges = ringEdges(outer);
  const length = (i: number) => {
    const edge = edges[i];
    return edge === undefined ? 0 : Math.hypot(edge.to.x - edge.from.x, edge.to.y - edge.from.y);
  };
  const longest = edges.reduce((best, _, i) => (length(i) > length(best) ? i : best), 0);
  const edge = edges[longest] ?? edgeOf({ x: 0, y: 0 }, { x: 0, y: 0 });
  const [p, d] = [pointOnEdge(edge, 0.5), directionAt(edge, 0.5)];
  const step = 1e-6 * length(longest);
  return { x: p.x - step * d.y, y: p.y + step * d.x };
};

const pieceOf = (elastic: ElasticValues, m: Moments, segments: readonly CutSegment[]): CutPiece => {
  const flow = (direction: "x" | "y") => {
    const { a, b } = stressGrowth(elastic, direction);
    return a * m.x + b * m.y;
  };
  const [perVx, perVy] = [flow("x"), flow("y")];
  const length = segments.reduce((sum, one) => sum + lengthOf(one), 0);
  return {
    area: m.area,
    Qx: m.y,
    Qy: m.x,
    perVx,
    perVy,
    segments,
    length,
    meanPerVx: length > 0 ? perVx / length : null,
    meanPerVy: length > 0 ? perVy / length : null,
    shared: segments.length > 1,
  };
};

/**
 * First moments and shear flow of what lies in all of the given half-planes, by connected pieces.
 * @param halfPlanes one for a straight cut, more to take off a flange or a tip; unit normals, drawing coordinates, mm.
 * @returns the pieces, largest first; none where nothing lies there. Faults: `cut.badHalfPlane` with a pointer,
 * `section.noArea`, `section.notFinite`, `clip.failed`, or those of the arrangement. Flows are exact for lines and arcs, with unsymmetrical
 * bending; a piece cut off through several segments (as from a closed cell) has the sum of their flows only.
 * @source Jourawski: F = ∫n(a·x + b·y) dA over the piece, `stressGrowth` for a and b; VQ/I where x and y are principal.
 */
export const sectionCut = (
  section: Section,
  halfPlanes: readonly HalfPlane[],
): Result<readonly CutPiece[], readonly Fault[]> => {
  const bad = halfPlanes.findIndex(badHalfPlane);
  if (bad >= 0 || halfPlanes.length === 0)
    return err([
      {
        code: "cut.badHalfPlane",
        detail: "A cut needs lines with a direction and a place: correct the line.",
        pointer: `/halfPlanes/${Math.max(bad, 0)}`,
      },
    ]);
  const parts = stiffParts(section);
  const ratio = modularRatio(section.reference);
  const elastic = elasticOf(weightedBy(parts, ratio));
  if (elastic === null) return err([{ code: "section.noArea", detail: "The parts leave no area to cut." }]);
  const stiff = parts.length === section.parts.length ? ok(section) : rearranged(section, parts, []);
  if (!stiff.ok) return stiff;
  const outline = clipAll(stiff.value.outline, halfPlanes);
  if (!outline.ok) return err([outline.error]);
  const pieces = outline.value.regions;
  const sums = pieces.map(() => NO_MOMENTS);
  for (const part of parts) {
    const cut = clipAll(part.regions, halfPlanes);
    if (!cut.ok) return err([{ ...cut.error, part: part.id }]);
    for (const region of cut.value.regions) {
      const inner = innerPoint(region);
      const holder = pieces.findIndex((piece) => ringContains(piece.outer, inner));
      const at = holder < 0 ? nearestRegion(pieces, inner) : holder;
      const m = regionMoments([region], elastic.values.centroid);
      sums[at] = addMoments(sums[at] ?? NO_MOMENTS, m, ratio(part.material));
    }
  }
  const segments = outline.value.segments.map((one) => ({
    one,
    piece: nearestRegion(pieces, { x: (one.from.x + one.to.x) / 2, y: (one.from.y + one.to.y) / 2 }),
  }));
  const cut = sums.map((m, i) =>
    pieceOf(
      elastic.values,
      m,
      segments.flatMap(({ one, piece }) => (piece === i ? [one] : [])),
    ),
  );
  return everyNumberIsFinite(cut)
    ? ok(cut.toSorted((a, b) => b.area - a.area))
    : err([{ code: "section.notFinite", detail: "The sizes are beyond what can be computed: check them." }]);
};
