import { FAMILY_DIMENSIONS, type Profile } from "@/lib/profiles/families";
import type { ConventionCode } from "@/lib/intake/conventions";
import { FIELDS, type DimensionKey } from "@/lib/intake/fields";
import type { FamilyFound } from "@/lib/intake/family-of-row";
import { hollowRadii } from "@/lib/intake/hollow-radii";
import type { TypedRow } from "@/lib/intake/read-row";
import type { RowReason } from "@/lib/intake/row-reason";
import { err, ok, type Result } from "@/lib/result";

/** The profile a row describes; `built` says in words what was taken from a standard because the table does not print it. */
export type ProfileBuilt = Readonly<{
  profile: Profile;
  built: readonly string[];
  nominalWallMm: number | null;
  /** Conventions of tables that such a row may follow. */ applicable: readonly ConventionCode[];
}>;

type Sizes = Readonly<Partial<Record<DimensionKey, number>>>;
type Raw = Readonly<{
  dimensions: Record<string, number>;
  built?: readonly string[];
  nominalWallMm?: number | null;
  applicable?: readonly ConventionCode[];
}>;

class Missing extends Error {
  constructor(readonly keys: readonly DimensionKey[]) {
    super("missing dimension");
  }
}

const need = (sizes: Sizes, ...keys: readonly DimensionKey[]): number => {
  for (const key of keys) {
    const value = sizes[key];
    if (value !== undefined) return value;
  }
  throw new Missing(keys);
};

/** Sizes of a row as a profile of its family. A needed size that is not there is a reason naming it, never a default. */
export function profileOfRow(row: TypedRow, found: FamilyFound): Result<ProfileBuilt, RowReason> {
  const sizes: Sizes = Object.fromEntries(Object.entries(row.dimensions).map(([key, m]) => [key, m.value]));
  try {
    const raw = rawOf(sizes, found, row.standard);
    const parsed = FAMILY_DIMENSIONS[found.family].safeParse(raw.dimensions);
    if (!parsed.success) {
      const issue = parsed.error.issues[0];
      return err({
        verdict: "refused",
        cause: "geometry",
        detail: `${issue?.path.join(".") ?? "A dimension"} of the ${found.family} is outside its range (${issue?.message ?? ""}).`,
      });
    }
    // Safe cast: the dimensions were parsed by the schema of this very family.
    const profile = { family: found.family, dimensions: parsed.data } as Profile;
    const nominalWallMm = raw.nominalWallMm ?? sizes.nominalThickness ?? null;
    const applicable = raw.applicable ?? (nominalWallMm === null ? [] : ["mass-by-nominal-wall" as const]);
    return ok({ profile, built: raw.built ?? [], nominalWallMm, applicable });
  } catch (error) {
    if (!(error instanceof Missing)) throw error;
    return err(missingReason(row, error.keys, found));
  }
}

function missingReason(row: TypedRow, keys: readonly DimensionKey[], found: FamilyFound): RowReason {
  const blank = keys.find((key) => row.blanks.includes(key));
  const unread = keys.find(
    (key) => row.reasons.some((r) => r.field === key) || row.ambiguous.some((a) => a.field === key),
  );
  const key = unread ?? blank ?? keys[0] ?? "thickness";
  const name = FIELDS[key].label.toLowerCase();
  const how = unread !== undefined ? "cannot be read" : blank !== undefined ? "is blank" : "has no column";
  return {
    verdict: "refused",
    cause: "missing-dimension",
    detail: `The ${name} ${how}: the ${found.family} cannot be drawn, nothing to compute.`,
    field: key,
  };
}

function rawOf(sizes: Sizes, found: FamilyFound, standard: string): Raw {
  switch (found.family) {
    case "i-section":
    case "channel":
      return flanged(sizes, found);
    case "tee":
      return {
        dimensions: {
          depth: need(sizes, "depth"),
          flangeWidth: need(sizes, "width"),
          webThickness: need(sizes, "webThickness"),
          flangeThickness: need(sizes, "flangeThickness"),
          rootRadius: rootRadius(sizes, need(sizes, "flangeThickness")),
        },
      };
    case "angle":
      return angle(sizes);
    case "rectangular-hollow":
      return rectangularHollow(sizes, found, standard);
    case "round-hollow":
      return {
        dimensions: { diameter: need(sizes, "diameter", "depth", "width"), thickness: wall(sizes) },
        nominalWallMm: nominalWall(sizes, found),
      };
    case "flat":
      return { dimensions: { width: need(sizes, "width", "depth"), thickness: wall(sizes) } };
    case "round":
      return { dimensions: { diameter: need(sizes, "diameter", "depth", "width") } };
    case "timber":
      return { dimensions: { width: need(sizes, "width"), depth: need(sizes, "depth") } };
    case "zee":
      return {
        dimensions: {
          depth: need(sizes, "depth"),
          flangeWidth: need(sizes, "width"),
          thickness: wall(sizes),
          innerRadius: need(sizes, "innerRadius", "rootRadius"),
        },
      };
    case "lipped-channel":
      return {
        dimensions: {
          depth: need(sizes, "depth"),
          flangeWidth: need(sizes, "width"),
          lip: need(sizes, "lip"),
          thickness: wall(sizes),
          innerRadius: need(sizes, "innerRadius", "rootRadius"),
        },
      };
    case "i-section-unequal":
      throw new Missing(["flangeThickness"]);
    default:
      return found.family satisfies never;
  }
}

const wall = (sizes: Sizes) => need(sizes, "thickness", "webThickness", "flangeThickness");

/** r as printed; US tables print k for design instead, and r = k − tf reproduces their areas. */
function rootRadius(sizes: Sizes, flangeThickness: number): number {
  if (sizes.rootRadius !== undefined) return sizes.rootRadius;
  if (sizes.kDesign !== undefined) return Math.max(0, sizes.kDesign - flangeThickness);
  throw new Missing(["rootRadius", "kDesign"]);
}

/** US rolled slopes: 2 in 12 on the inner faces of flanges. */
const US_SLOPE = 2 / 12;

function flanged(sizes: Sizes, found: FamilyFound): Raw {
  const depth = need(sizes, "depth");
  const flangeWidth = need(sizes, "width");
  const webThickness = need(sizes, "webThickness");
  const flangeThickness = need(sizes, "flangeThickness");
  const base = { depth, flangeWidth, webThickness, flangeThickness };
  if (found.taper === "u-8-5") {
    const shallow = depth <= 300;
    const flangeSlope = sizes.flangeSlope ?? (shallow ? 0.08 : 0.05);
    const thicknessAt = shallow ? flangeWidth / 2 : (flangeWidth + webThickness) / 2;
    const root = sizes.rootRadius ?? flangeThickness;
    const toeRadius = sizes.toeRadius ?? flangeThickness / 2;
    const where = shallow ? "half the flange width" : "the middle of the flange's free part";
    return {
      dimensions: { ...base, rootRadius: root, flangeSlope, toeRadius, thicknessAt },
      built: [
        `flange slope ${flangeSlope * 100} %, tf at ${where}${sizes.toeRadius === undefined ? ", toe radius tf/2" : ""} (EN 10365, DIN 1026-1)`,
      ],
    };
  }
  if (found.taper === "us-2-in-12") {
    const flangeSlope = sizes.flangeSlope ?? US_SLOPE;
    const halfOutstand = (flangeWidth - webThickness) / (found.family === "channel" ? 2 : 4);
    const root =
      sizes.rootRadius ?? taperedRoot(sizes, flangeThickness + flangeSlope * halfOutstand, flangeSlope);
    const toeRadius =
      sizes.toeRadius ?? Math.min(root / 2, (flangeThickness - flangeSlope * halfOutstand) * 0.9);
    const thicknessAt = webThickness / (found.family === "channel" ? 1 : 2) + halfOutstand;
    return {
      dimensions: { ...base, rootRadius: root, flangeSlope, toeRadius, thicknessAt },
      built: [
        "flange slope 2 in 12, tf its mean, root radius from k, toe radius half of it: radii are not printed",
      ],
      applicable: ["radii-not-printed"],
    };
  }
  const slope =
    sizes.flangeSlope === undefined
      ? {}
      : { flangeSlope: sizes.flangeSlope, toeRadius: sizes.toeRadius ?? 0 };
  const root = rootRadius(sizes, flangeThickness);
  const built = sizes.rootRadius === undefined ? ["root radius = k − tf"] : [];
  return { dimensions: { ...base, rootRadius: root, ...slope }, built };
}

/**
 * Radius of a fillet between the web and an inner face sloping by `slope`, from the distance k between the outer face and the
 * fillet's end on the web: two faces meeting under 90° + θ leave a tangent length of r·tan(45° − θ/2).
 */
function taperedRoot(sizes: Sizes, flangeAtWeb: number, slope: number): number {
  if (sizes.kDesign === undefined) throw new Missing(["rootRadius", "kDesign"]);
  const tangent = sizes.kDesign - flangeAtWeb;
  return Math.max(0, tangent / Math.tan(Math.PI / 4 - Math.atan(slope) / 2));
}

function angle(sizes: Sizes): Raw {
  const thickness = wall(sizes);
  const legLong = need(sizes, "depth");
  const legShort = need(sizes, "width", "depth");
  if (sizes.rootRadius !== undefined) {
    const toeRadius = sizes.toeRadius ?? sizes.rootRadius / 2;
    return {
      dimensions: { legLong, legShort, thickness, rootRadius: sizes.rootRadius, toeRadius },
      built: sizes.toeRadius === undefined ? ["toe radius r/2 (EN 10056-1)"] : [],
    };
  }
  if (sizes.kDesign === undefined) throw new Missing(["rootRadius", "kDesign"]);
  return {
    dimensions: {
      legLong,
      legShort,
      thickness,
      rootRadius: Math.max(0, sizes.kDesign - thickness),
      toeRadius: sizes.toeRadius ?? 0,
    },
    built: [
      "root radius = k − t",
      ...(sizes.toeRadius === undefined ? ["toes square: their radius is not printed"] : []),
    ],
    applicable: sizes.toeRadius === undefined ? ["toes-not-printed"] : [],
  };
}

function rectangularHollow(sizes: Sizes, found: FamilyFound, standard: string): Raw {
  const thickness = wall(sizes);
  const depth = need(sizes, "depth");
  const width = need(sizes, "width", "depth");
  const radii = hollowRadii({
    thickness,
    standard,
    us: found.us,
    outer: sizes.outerRadius ?? sizes.rootRadius ?? null,
    inner: sizes.innerRadius ?? null,
  });
  if (radii === null) throw new Missing(["outerRadius", "rootRadius"]);
  return {
    dimensions: { depth, width, thickness, outerRadius: radii.outer, innerRadius: radii.inner },
    built: radii.built === "" ? [] : [radii.built],
    nominalWallMm: nominalWall(sizes, found),
  };
}

/** US hollow sections are designed with 0.93 of the nominal wall (ASTM A500). */
const nominalWall = (sizes: Sizes, found: FamilyFound) =>
  sizes.nominalThickness ?? (found.us ? wall(sizes) / 0.93 : null);
