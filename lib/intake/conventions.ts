import type { ComparedKey } from "@/lib/intake/fields";

/** Ways of tables that depart from the exact outline by a known share; a reading names those its table follows. */
export const CONVENTION_CODES = ["mass-by-nominal-wall", "toes-not-printed", "radii-not-printed"] as const;
export type ConventionCode = (typeof CONVENTION_CODES)[number];

type Convention = Readonly<{
  label: string;
  /** What it means, for the screen. */
  detail: string;
  keys: readonly ComparedKey[];
  /** Range of (tabulated − computed)/computed that the convention explains, as shares. */
  gap: readonly [number, number];
  source: string;
}>;

const FIGURES = [
  "area",
  "mass",
  "Ix",
  "Sx",
  "Zx",
  "rx",
  "Iy",
  "Sy",
  "Zy",
  "ry",
  "I2",
  "S2",
  "r2",
] as const satisfies readonly ComparedKey[];

/** Gaps as measured against exact outlines; `source` says where each comes from. */
export const CONVENTIONS: Record<ConventionCode, Convention> = {
  "mass-by-nominal-wall": {
    label: "Mass by nominal wall",
    detail: "The mass is for the nominal wall, the other figures for the design wall (0.93 of it).",
    keys: ["mass"],
    gap: [0.06, 0.075],
    source:
      "ASTM A500 tables with t design = 0.93 t nominal: mass by nominal wall is 6 to 7.5 % over A times density.",
  },
  "toes-not-printed": {
    label: "Toes of angles not printed",
    detail:
      "The legs are computed with square toes because the table prints no toe radius; the tabulated figures count rounded toes.",
    keys: FIGURES,
    gap: [-0.06, 0.005],
    source:
      "US angle tables: square toes overstate A by 1 to 2 % and the least I by 2 to 6 % (measured on exact outlines).",
  },
  "radii-not-printed": {
    label: "Radii of tapered flanges not printed",
    detail:
      "Fillet and toe radii of tapered flanges are not printed; they are computed from k and the flange.",
    keys: FIGURES,
    gap: [-0.025, 0.025],
    source:
      "US channel tables: flange slope 2 in 12, mean flange thickness, radii not printed (measured on exact outlines).",
  },
};
