import type { ArrangeCutout, ArrangePart, Notice } from "@/lib/geometry/arrange-types";
import { listNames } from "@/lib/geometry/arrange-types";
import type { ChordedParts } from "@/lib/geometry/chord-parts";
import { chordParts } from "@/lib/geometry/chord-parts";
import { cutPolygons, polygonsArea } from "@/lib/geometry/clip";
import { ringContains } from "@/lib/geometry/contains";
import type { Overlaps } from "@/lib/geometry/find-overlaps";
import { pairKey } from "@/lib/geometry/find-overlaps";
import type { Noding } from "@/lib/geometry/noding";
import { regionsOfParts } from "@/lib/geometry/noding";
import { recoverRegions } from "@/lib/geometry/recover";
import type { Region } from "@/lib/geometry/region";
import { reverseRing } from "@/lib/geometry/reverse-ring";
import { regionArea } from "@/lib/geometry/ring";
import { SNAP_STEPS_MM, TOUCH_MM } from "@/lib/geometry/tolerance";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";

/** Regions of every part, in the order given, with overlaps counted once and cut-outs taken away. */
export type Resolved = Readonly<{ regions: readonly (readonly Region[])[]; warnings: readonly Notice[] }>;

const areaOf = (regions: readonly Region[]): number =>
  regions.reduce((sum, region) => sum + regionArea(region), 0);

const squareMm = (area: number): string => `${Number(area.toPrecision(3))} mm²`;

/**
 * Whether part i keeps what it shares with part k, whatever order they were drawn in: stiff before mass only; then the
 * lower yield strength, on the safe side for plastic moment and squash load; then the larger; then the lower id.
 */
const keeps = (parts: readonly ArrangePart[], areas: readonly number[], i: number, k: number): boolean => {
  const [a, b, areaA = 0, areaB = 0] = [parts[i], parts[k], areas[i], areas[k]];
  if (a === undefined || b === undefined) return false;
  if (a.stiff !== b.stiff) return a.stiff;
  if (a.strength !== b.strength) return a.strength < b.strength;
  if (Math.abs(areaA - areaB) > 1e-9 * Math.max(areaA, areaB)) return areaA > areaB;
  return a.id < b.id;
};

type Job = Readonly<{ part: number; takers: readonly number[]; cuts: readonly number[] }>;

type Given = Readonly<{
  parts: readonly ArrangePart[];
  cutouts: readonly ArrangeCutout[];
  regions: readonly (readonly Region[])[];
  found: Overlaps;
  /** For each part and cut-out, those it overlaps. */
  partners: readonly (readonly number[])[];
}>;

const partnersOf = (found: Overlaps, count: number): readonly (readonly number[])[] => {
  const partners = Array.from({ length: count }, (): number[] => []);
  for (const [a, b] of found.overlaps) {
    partners[a]?.push(b);
    partners[b]?.push(a);
  }
  return partners;
};

const liesFreeIn = ({ regions, found }: Given, inner: number, outer: number): boolean =>
  found.inside[inner]?.has(outer) === true &&
  found.inside[outer]?.has(inner) !== true &&
  !found.meeting.has(pairKey(inner, outer, regions.length));

/** The part with its cut-outs as plain holes, where each lies in it and touches nothing; else null. */
const withHoles = (given: Given, { part, takers, cuts }: Job): readonly Region[] | null => {
  const { regions, partners } = given;
  const rings = cuts.flatMap((cut) => {
    const [only, ...more] = regions[cut] ?? [];
    const plain = only !== undefined && more.length === 0 && only.holes.length === 0;
    return plain && partners[cut]?.length === 1 && liesFreeIn(given, cut, part) ? [only.outer] : [];
  });
  if (takers.length > 0 || rings.length < cuts.length) return null;
  return (regions[part] ?? []).map(({ outer, holes }) => ({
    outer,
    holes: [
      ...holes,
      ...rings.filter(([at]) => at !== undefined && ringContains(outer, at)).map(reverseRing),
    ],
  }));
};

const cutNotices = (
  given: Given,
  { part, takers, cuts }: Job,
  before: number,
  after: number,
): readonly Notice[] => {
  const { parts, cutouts } = given;
  const own = parts[part];
  if (own === undefined) return [];
  const keepers = takers.flatMap((k) => parts[k] ?? []);
  const gone = after <= TOUCH_MM * Math.sqrt(before);
  if (gone) {
    const by = [...keepers, ...cuts.flatMap((c) => cutouts[c - parts.length] ?? [])];
    const detail = `Nothing is left of ${own.name}: ${listNames(by.map(({ name }) => name))} cover it whole.`;
    return [{ code: "part.covered", detail, parts: [own.id, ...by.map(({ id }) => id)] }];
  }
  if (keepers.length === 0) return [];
  const weaker = keepers.some(({ strength }) => strength < own.strength);
  const why = weaker ? ", which has the lower yield strength" : "";
  return [
    {
      code: "overlap.countedOnce",
      detail: `${own.name} overlaps ${listNames(keepers.map(({ name }) => name))}: what they share counts once, as ${keepers.length === 1 ? "part of the latter" : "part of those"}${why}.`,
      parts: [own.id, ...keepers.map(({ id }) => id)],
    },
  ];
};

const coarser = (step: number, parts: readonly string[]): readonly Notice[] =>
  step === SNAP_STEPS_MM[0]
    ? []
    : [
        {
          code: "clip.coarser",
          detail: `The overlap was worked out on a grid of ${Number(step.toPrecision(2))} mm, coarser than usual.`,
          parts,
        },
      ];

type Done = Readonly<{ regions: readonly Region[]; warnings: readonly Notice[] }>;

const runJob = (given: Given, chorded: () => ChordedParts, job: Job): Result<Done, Fault> => {
  const own = given.regions[job.part] ?? [];
  const name = given.parts[job.part];
  if (job.takers.length + job.cuts.length === 0) return ok({ regions: own, warnings: [] });
  const holed = withHoles(given, job);
  if (holed !== null) return ok({ regions: holed, warnings: [] });
  const { polygons, sources } = chorded();
  const cut = cutPolygons(polygons(job.part), [...job.takers, ...job.cuts].map(polygons));
  if (!cut.ok) return name === undefined ? cut : err({ ...cut.error, part: name.id });
  const regions = recoverRegions(cut.value.value.rest, sources, cut.value.stepMm);
  return ok({
    regions,
    warnings: [
      ...cutNotices(given, job, areaOf(own), areaOf(regions)),
      ...coarser(cut.value.stepMm, name === undefined ? [] : [name.id]),
    ],
  });
};

/** What each cut-out does that its drawer may not have meant: cuts nothing, or reaches outside of the material. */
const cutoutNotices = (given: Given, chorded: () => ChordedParts): Result<readonly Notice[], Fault> => {
  const { parts, cutouts, partners, regions } = given;
  const notices: Notice[] = [];
  for (const [i, { id, name }] of cutouts.entries()) {
    const self = parts.length + i;
    const around = (partners[self] ?? []).filter((k) => k < parts.length);
    if (around.length === 0) {
      notices.push({
        code: "cutout.nothing",
        detail: `${name} cuts nothing: it lies outside of every part.`,
        parts: [id],
      });
      continue;
    }
    if (around.some((k) => liesFreeIn(given, self, k))) continue;
    const { polygons } = chorded();
    const cut = cutPolygons(polygons(self), around.map(polygons));
    if (!cut.ok) return err({ ...cut.error, part: id });
    const outside = polygonsArea(cut.value.value.rest);
    if (outside > TOUCH_MM * Math.sqrt(areaOf(regions[self] ?? [])))
      notices.push({
        code: "cutout.outside",
        detail: `${name} reaches outside of the material by ${squareMm(outside)}; only what lies inside is taken away.`,
        parts: [id],
      });
  }
  return ok(notices);
};

/**
 * Settles overlaps: each part loses what another part keeps (`keeps`) and what the cut-outs take. Parts that overlap
 * nothing come back as they are.
 * @param noding parts first, then cut-outs, in the order given.
 * @returns regions of the parts only, or `clip.failed` with the part's id.
 */
export const resolveOverlaps = (
  noding: Noding,
  found: Overlaps,
  parts: readonly ArrangePart[],
  cutouts: readonly ArrangeCutout[],
): Result<Resolved, Fault> => {
  const count = parts.length + cutouts.length;
  const regions = regionsOfParts(noding, count);
  const areas = regions.map(areaOf);
  const given: Given = { parts, cutouts, regions, found, partners: partnersOf(found, count) };
  let made: ChordedParts | null = null;
  const concerned = new Set(found.overlaps.flat());
  const chorded = () => (made ??= chordParts(noding, concerned));
  const settled: (readonly Region[])[] = [];
  const warnings: Notice[] = [];
  for (const part of parts.keys()) {
    const others = given.partners[part] ?? [];
    const done = runJob(given, chorded, {
      part,
      takers: others.filter((k) => k < parts.length && keeps(parts, areas, k, part)),
      cuts: others.filter((k) => k >= parts.length),
    });
    if (!done.ok) return done;
    settled.push(done.value.regions);
    warnings.push(...done.value.warnings);
  }
  const notices = cutoutNotices(given, chorded);
  return notices.ok ? ok({ regions: settled, warnings: [...warnings, ...notices.value] }) : notices;
};
