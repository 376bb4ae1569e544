import type { Family } from "@/lib/profiles/families";
import { FAMILIES } from "@/lib/intake/schema";

/** How flanges of a series are shaped where the table prints no slope. */
export type Taper = "none" | "u-8-5" | "us-2-in-12";

export type FamilyFound = Readonly<{ family: Family; taper: Taper; us: boolean; evidence: string }>;

type Rule = readonly [pattern: RegExp, family: Family, taper?: Taper, us?: boolean];

/** Series as mills and tables name them, on upper-case letters without spaces. */
const SERIES: readonly Rule[] = [
  [/^(UPN|UNP|INPU)$/, "channel", "u-8-5"],
  [/^(UPE|PFC|UAP|CHANNEL)$/, "channel"],
  [/^(C|MC)$/, "channel", "us-2-in-12", true],
  [/^(HSSR|HSSROUND|PIPE|PIPESTD|PIPEXS)$/, "round-hollow", "none", true],
  [/^HSS$/, "rectangular-hollow", "none", true],
  [/^(SHS|RHS|QRO|RRO|HFRHS|HFSHS|CFRHS|CFSHS|MSHQ|MSHR|TUBE)$/, "rectangular-hollow"],
  [/^(CHS|ROR|RO|HFCHS|CFCHS|MSHC)$/, "round-hollow"],
  [/^(W|M|HP)$/, "i-section", "none", true],
  [/^S$/, "i-section", "us-2-in-12", true],
  [
    /^(IPE|IPEA|IPEO|IPEAA|IPER|IPEV|HEA|HEB|HEM|HEAA|HE|HD|HL|HPA|UB|UC|UBP|UKB|UKC|WB|NS|RB|I|H|WF)$/,
    "i-section",
  ],
  [/^(WT|MT|ST|T|TEE)$/, "tee"],
  [/^(L|LNP|EA|UA|RSA|ANGLE)$/, "angle"],
  [/^(FL|FLT|FLA|FLAT|FLACH|FLAR|PLATE|PL)$/, "flat"],
  [/^(RD|RND|ROUND|RUND|BARRD)$/, "round"],
  [/^(Z|ZED|ZEE)$/, "zee"],
  [/^(LC|LIPPEDC|CEE)$/, "lipped-channel"],
  [/^(TIMBER|SAWN|GL|GLULAM|HOLZ|KVH|BSH)$/, "timber"],
];

const ruleFor = (token: string) => SERIES.find(([pattern]) => pattern.test(token));

/** Family by the series cell, else by the letters a designation begins with, else by the reading's default. */
export function familyOfRow(
  series: string,
  designation: string,
  fallback: Family | null,
): FamilyFound | null {
  const own = FAMILIES.find((f) => f === series.toLowerCase().trim());
  if (own !== undefined) return { family: own, taper: "none", us: false, evidence: `the series says ${own}` };
  const token = series.toUpperCase().replace(/[^A-Z]/g, "");
  const bySeries = token === "" ? undefined : ruleFor(token);
  if (bySeries !== undefined) return settle(bySeries, designation, `series ${series}`);
  const letters = /^[A-Za-z]+/.exec(designation.trim())?.[0].toUpperCase() ?? "";
  const head = letters.endsWith("X") ? letters.slice(0, -1) : letters;
  const byName = head === "" ? undefined : ruleFor(head);
  if (byName !== undefined) return settle(byName, designation, `designation begins with ${head}`);
  return fallback === null
    ? null
    : { family: fallback, taper: "none", us: false, evidence: "the reading's family" };
}

/** "HSS6.625X0.280" has two sizes and is round; "HSS8X4X1/4" has three. */
function settle(
  [, family, taper = "none", us = false]: Rule,
  designation: string,
  evidence: string,
): FamilyFound {
  const sizes = designation.replace(/^[A-Za-z ]+/, "").split(/[x×]/i).length;
  if (family === "rectangular-hollow" && us && sizes === 2)
    return { family: "round-hollow", taper, us, evidence: `${evidence}, two sizes` };
  return { family, taper, us, evidence };
}
