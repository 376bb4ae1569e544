import "server-only";
import type { Row } from "@/db/bulk-insert";
import { AppError } from "@/lib/errors";
import type { FiguresSource } from "@/lib/schemas/bay";
import { foldForSearch } from "@/lib/schemas/designation";
import type { Properties } from "@/lib/schemas/properties";
import type { PropertyKey } from "@/lib/units/property-units";
import { effectiveOf, type Scalars } from "./figure-values";

const VALUES = [
  "mass",
  "area",
  "Ix",
  "Iy",
  "I1",
  "I2",
  "Sx",
  "Sy",
  "S1",
  "S2",
  "Zx",
  "Zy",
  "rx",
  "ry",
  "r1",
  "r2",
  "J",
  "Cw",
] as const satisfies readonly PropertyKey[];
const NEEDED: ReadonlySet<string> = new Set(["mass", "area", "Ix", "Iy", "Sx", "Sy", "rx", "ry"]);

export const FINDER_COLUMNS = [
  ..."id organisation_id bay_id shape_id lane state ordinal family designation title folded source".split(
    " ",
  ),
  ...VALUES,
  ..."depth width unsymmetrical factorX factorY SxFree SyFree jobs".split(" "),
];

type Facts = Readonly<{
  revisionId: string;
  organisationId: string;
  bayId: string;
  shapeId: string;
  lane: "released" | "working";
  state: "draft" | "submitted" | "released" | "withdrawn";
  ordinal: number;
  family: string;
  designation: string;
  title: string;
  counts: FiguresSource;
  computed: Scalars;
  tabulated: Scalars | null;
  unsymmetrical: Properties["unsymmetrical"];
  jobs: number;
}>;

/** Text the search looks in: designation and title, folded. */
export const foldedText = (designation: string, title: string): string =>
  `${foldForSearch(designation)}|${foldForSearch(title)}`;

/** The finder row of one revision, values as they count in its bay, in the order of FINDER_COLUMNS. */
export const finderRow = (facts: Facts): Row => {
  const { source, value } = effectiveOf(facts.counts, facts.computed, facts.tabulated);
  const extent = (low: PropertyKey, high: PropertyKey): number => {
    const [from, to] = [facts.computed[low], facts.computed[high]];
    if (typeof from !== "number" || typeof to !== "number" || !(to > from)) {
      throw new AppError("invalid", { user: `${facts.designation}: the section has no size.` });
    }
    return to - from;
  };
  const values = VALUES.map((key) => {
    const found = value(key);
    if (found === null && NEEDED.has(key)) {
      throw new AppError("invalid", { user: `${facts.designation}: ${key} could not be computed.` });
    }
    return found;
  });
  const free = facts.unsymmetrical;
  return [
    facts.revisionId,
    facts.organisationId,
    facts.bayId,
    facts.shapeId,
    facts.lane,
    facts.state,
    facts.ordinal,
    facts.family,
    facts.designation,
    facts.title,
    foldedText(facts.designation, facts.title),
    source,
    ...values,
    extent("extents.yMin", "extents.yMax"),
    extent("extents.xMin", "extents.xMax"),
    free ? 1 : 0,
    free?.factorX ?? null,
    free?.factorY ?? null,
    free?.SxFree ?? null,
    free?.SyFree ?? null,
    facts.jobs,
  ];
};
