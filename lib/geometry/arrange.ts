import type { ArrangeCutout, ArrangePart, Arrangement, Notice } from "@/lib/geometry/arrange-types";
import { listNames } from "@/lib/geometry/arrange-types";
import type { Bodies, NameOf } from "@/lib/geometry/contacts";
import { bodiesOf, outlineOf, separationNotices, sharedLines } from "@/lib/geometry/contacts";
import type { Overlaps, Pair } from "@/lib/geometry/find-overlaps";
import { findOverlaps } from "@/lib/geometry/find-overlaps";
import { neighbourBoxes } from "@/lib/geometry/neighbours";
import type { Noding } from "@/lib/geometry/noding";
import { nodeParts, regionsOfParts } from "@/lib/geometry/noding";
import type { Point, Region } from "@/lib/geometry/region";
import { regionArea } from "@/lib/geometry/ring";
import { resolveOverlaps } from "@/lib/geometry/resolve-overlaps";
import { alignEdges, edgeGroups } from "@/lib/geometry/shared-edges";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";

/** Pairs of overlapping parts beyond this are refused: each may need a clip of its own. */
export const MAX_OVERLAPS = 5_000;

/** Share by which the settled parts may differ in area from the outline that they fill; more is refused, not passed on. */
const FILL_REL = 1e-8;

const mixedMaterials = (parts: readonly ArrangePart[], overlaps: readonly Pair[]): readonly Fault[] =>
  overlaps.flatMap(([i, k]) => {
    const [a, b] = [parts[i], parts[k]];
    if (a === undefined || b === undefined || a.material === b.material) return [];
    const detail = `${a.name} and ${b.name} overlap but are of different materials. Move one of them, or cut it out where the other lies.`;
    return [{ code: "overlap.differentMaterials", detail, part: a.id }];
  });

const tooMany = (overlaps: readonly Pair[]): readonly Fault[] =>
  overlaps.length <= MAX_OVERLAPS
    ? []
    : [
        {
          code: "arrangement.tooManyOverlaps",
          detail: `${overlaps.length} pairs of parts overlap; ${MAX_OVERLAPS} are allowed. Draw parts side by side, or join them in one outline.`,
        },
      ];

/** The cut-outs along whose edges more than one body ends. */
const partingCutouts = (noding: Noding, bodies: Bodies, first: number): ReadonlySet<number> => {
  const ends = new Map<number, Set<number>>();
  for (const group of edgeGroups(noding)) {
    for (const { part } of group) {
      if (part < first) continue;
      for (const other of group) {
        const body = bodies.bodyOf(other.part, noding.rings[other.ring]?.region ?? 0);
        if (body === undefined) continue;
        ends.set(part, (ends.get(part) ?? new Set<number>()).add(body));
      }
    }
  }
  return new Set([...ends].filter(([, found]) => found.size > 1).map(([part]) => part));
};

const partedNotice = (
  arranged: Readonly<{ noding: Noding; bodies: Bodies }>,
  parts: readonly ArrangePart[],
  cutouts: readonly ArrangeCutout[],
  nameOf: NameOf,
): Result<readonly Notice[], readonly Fault[]> => {
  const { noding, bodies } = arranged;
  if (cutouts.length === 0 || bodies.parts.length < 2) return ok([]);
  const whole = arrange(parts, []);
  if (!whole.ok) return whole;
  if (whole.value.bodies.length >= bodies.parts.length) return ok([]);
  const found = partingCutouts(noding, bodies, parts.length);
  const named = cutouts.filter((_, i) => found.size === 0 || found.has(parts.length + i));
  const pieces = bodies.parts.map((body) => listNames(body.map((part) => nameOf(part).name)));
  return ok([
    {
      code: "cutout.parts",
      detail: `${listNames(named.map(({ name }) => name))} ${named.length > 1 ? "part" : "parts"} the section into ${bodies.parts.length} pieces that no longer hang together: ${pieces.join(" / ")}.`,
      parts: named.map(({ id }) => id),
    },
  ]);
};

/**
 * Arranges parts: nodes them against each other, counts overlaps of one material once, takes cut-outs away, and finds what
 * touches what. Parts that meet no other keep their coordinates and arcs to the last bit; where parts overlap, corners
 * are the true crossings of lines and arcs.
 * @param parts regions directed as `Region` asks, mm, about an origin near the drawing.
 * @param origin where that origin lies in the drawing; only words use it.
 * @returns faults (`overlap.differentMaterials`, `arrangement.tooManyOverlaps`, `arrangement.tooDense`, `clip.failed`, `arrangement.inexact`)
 * that name parts by id, or the arrangement.
 */
export const arrange = (
  parts: readonly ArrangePart[],
  cutouts: readonly ArrangeCutout[],
  origin: Point = { x: 0, y: 0 },
): Result<Arrangement, readonly Fault[]> => {
  const all = [...parts, ...cutouts];
  const neighbours = neighbourBoxes(all.map(({ regions }) => regions));
  const drawn = alignEdges(nodeParts(all.map(({ regions }) => regions)));
  const found = findOverlaps(drawn, neighbours);
  if (!found.ok) return err([found.error]);
  const faults = [...tooMany(found.value.overlaps), ...mixedMaterials(parts, found.value.overlaps)];
  if (faults.length > 0) return err(faults);
  const settled = settle(drawn, found.value, parts, cutouts);
  if (!settled.ok) return err([settled.error]);
  const { noding, warnings } = settled.value;
  const regions = regionsOfParts(noding, all.length).slice(0, parts.length);
  const isPart = (part: number) => part < parts.length;
  const bodies = bodiesOf(noding, (part) => parts[part]?.stiff === true);
  const nameOf = (part: number) => all[part] ?? { id: "", name: "" };
  const parted = partedNotice({ noding, bodies }, parts, cutouts, nameOf);
  if (!parted.ok) return parted;
  const separate =
    parted.value.length > 0 ? [] : separationNotices(noding, bodies, found.value.grazes, nameOf, origin);
  const outline = outlineOf(noding, isPart);
  const [inParts, inOutline] = [areaOf(regions.flat()), areaOf(outline)];
  if (!(Math.abs(inParts - inOutline) <= FILL_REL * inParts)) return err([inexact]);
  return ok({
    parts: regions,
    outline,
    contacts: sharedLines(noding).filter(({ parts: [, b] }) => isPart(b)),
    bodies: bodies.parts,
    warnings: [...warnings, ...parted.value, ...separate],
  });
};

const areaOf = (regions: readonly Region[]): number =>
  regions.reduce((sum, region) => sum + regionArea(region), 0);

const inexact: Fault = {
  code: "arrangement.inexact",
  detail:
    "The parts could not be arranged without gaps or overlaps. Move one of those that overlap a little, or join them in one outline.",
};

type Settled = Readonly<{ noding: Noding; warnings: readonly Notice[] }>;

/** The noding of parts without overlap: the drawn one where there was none, else that of the settled regions. */
const settle = (
  drawn: Noding,
  found: Overlaps,
  parts: readonly ArrangePart[],
  cutouts: readonly ArrangeCutout[],
): Result<Settled, Fault> => {
  if (found.overlaps.length === 0 && cutouts.length === 0) return ok({ noding: drawn, warnings: [] });
  const resolved = resolveOverlaps(drawn, found, parts, cutouts);
  if (!resolved.ok) return resolved;
  const { regions, warnings } = resolved.value;
  const noding = alignEdges(nodeParts([...regions, ...cutouts.map((cutout) => cutout.regions)]));
  return ok({ noding, warnings });
};
