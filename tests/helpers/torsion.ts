import type { Region, Vertex } from "@/lib/geometry/region";
import { cosSinOfDegrees } from "@/lib/geometry/ring";
import { reverseRing } from "@/lib/geometry/reverse-ring";
import type { Section } from "@/lib/section/section";
import { runToEnd } from "@/lib/section/torsion/run-to-end";
import { solveTorsion, type TorsionOptions } from "@/lib/section/torsion/solve-torsion";
import type { TorsionProperties } from "@/lib/section/torsion/torsion-properties";
import { must } from "@/tests/helpers/must";
import { sectionOfRegions } from "@/tests/helpers/sections";

/** Torsion of a section, expected to succeed. */
export const torsionOf = (section: Section, options: TorsionOptions = {}): TorsionProperties =>
  must(runToEnd(solveTorsion(section, options)));

/** Torsion of one steel part with these regions. */
export const torsionOfRegions = (...regions: readonly Region[]): TorsionProperties =>
  torsionOf(sectionOfRegions(regions));

/** Torsion that must be connected: figures without null. */
export const connectedTorsion = (section: Section, options: TorsionOptions = {}) => {
  const t = torsionOf(section, options);
  const { Cw, shearCentre, Avx, Avy, betaX, betaY, r0, estimates } = t;
  if (Cw === null || shearCentre === null || Avx === null || Avy === null) throw new Error("not connected");
  if (betaX === null || betaY === null || r0 === null) throw new Error("not connected");
  if (estimates.Cw === null || estimates.shearCentre === null) throw new Error("not connected");
  return {
    ...t,
    Cw,
    shearCentre,
    Avx,
    Avy,
    betaX,
    betaY,
    r0,
    estimates: { ...estimates, Cw: estimates.Cw, shearCentre: estimates.shearCentre },
  };
};

export type Motion = Readonly<{
  scale?: number;
  degrees?: number;
  dx?: number;
  dy?: number;
  mirror?: boolean;
}>;

/** A point scaled, mirrored (x → −x), turned and moved, in that order. */
export const movePoint = (
  v: Vertex,
  { scale = 1, degrees = 0, dx = 0, dy = 0, mirror = false }: Motion,
): Vertex => {
  const [c, s] = cosSinOfDegrees(degrees);
  const [x, y] = [(mirror ? -scale : scale) * v.x, scale * v.y];
  const bulge = mirror ? -(v.bulge ?? 0) : (v.bulge ?? 0);
  return { x: dx + c * x - s * y, y: dy + s * x + c * y, ...(bulge === 0 ? {} : { bulge }) };
};

/** A region scaled, mirrored, turned and moved. */
export const moveShape = (region: Region, motion: Motion): Region => {
  const move = (ring: Region["outer"]) => {
    const moved = ring.map((v) => movePoint(v, motion));
    if (motion.mirror !== true) return moved;
    // Edges turn round with their ring: the bulge of an edge is kept by its first vertex.
    return reverseRing(moved);
  };
  return { outer: move(region.outer), holes: region.holes.map(move) };
};
