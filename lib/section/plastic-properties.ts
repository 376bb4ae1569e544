import type { ElasticValues } from "@/lib/section/elastic";
import { plasticAxis, type PlasticAxis } from "@/lib/section/plastic";
import type { Absent, SectionProperties } from "@/lib/section/properties";
import type { SectionPart, SectionWarning } from "@/lib/section/section";
import { differs, weightedBy } from "@/lib/section/stiffness";

type PlasticValues = Pick<
  SectionProperties,
  "Zx" | "Zy" | "Z1" | "Z2" | "pna" | "equalForceAxis" | "Mp" | "squash"
>;

/** Plastic values with what has to be said about them. */
export type PlasticProperties = Readonly<{
  values: PlasticValues;
  absent: readonly Absent[];
  warnings: readonly SectionWarning[];
}>;

/** What every section with area has; the equal-force axis is for mixed strengths only. */
const ALWAYS = ["Zx", "Zy", "Z1", "Z2", "pna", "Mp", "squash"] as const;

const QUARTER_TURN = Math.PI / 2;

const gapWarnings = (axes: readonly (readonly [string, PlasticAxis | null])[], what: string) =>
  axes.flatMap(([name, axis]): readonly SectionWarning[] =>
    axis === null || axis.gap === 0
      ? []
      : [
          {
            code: "plastic.axisInGap",
            detail: `Any axis parallel to ${name} within ${axis.gap.toPrecision(4)} mm ${what}; the middle one is given.`,
            parts: [],
          },
        ],
  );

/**
 * Z and the equal-area axes about x, y, 1 and 2; where fy differs also the equal-force axes; Mp and the squash load.
 * @param parts the parts that count for stiffness, at least one with area.
 * @param elastic their elastic properties (centroid and angle of axis 1).
 * @returns Z in mm³, axes in drawing coordinates (mm), Mp in N·mm, squash load in N. With one fy, Mp = fy·Z and the
 * equal-force axis is null, being the equal-area axis. Where half of the area lies on each side of a gap, the axis in
 * the middle of it is given and a warning says so.
 * @source Plastic bending, perfectly plastic material: Z = Σ|first moment of the halves|, Mp = ∫ fy |s| dA.
 */
export const plasticProperties = (
  parts: readonly SectionPart[],
  elastic: ElasticValues,
): PlasticProperties => {
  const { centroid } = elastic;
  const angle = (elastic.angle * Math.PI) / 180;
  const areas = weightedBy(parts, () => 1);
  const about = (at: number) => plasticAxis(areas, at, centroid);
  const [x, y, one, two] = [about(0), about(QUARTER_TURN), about(angle), about(angle + QUARTER_TURN)];
  const mixed = differs(parts, (material) => material.fy);
  const forces = weightedBy(parts, (material) => material.fy);
  const fx = mixed ? plasticAxis(forces, 0, centroid) : null;
  const fy = mixed ? plasticAxis(forces, QUARTER_TURN, centroid) : null;
  const yieldStress = parts[0]?.material.fy ?? 0;
  // The normal of the axis along +y points to −x.
  const place = (h: PlasticAxis, v: PlasticAxis) => ({ x: centroid.x - v.offset, y: centroid.y + h.offset });
  const Mp =
    fx !== null && fy !== null
      ? { x: fx.modulus, y: fy.modulus }
      : x !== null && y !== null
        ? { x: yieldStress * x.modulus, y: yieldStress * y.modulus }
        : null;
  const values: PlasticValues = {
    Zx: x?.modulus ?? null,
    Zy: y?.modulus ?? null,
    Z1: one?.modulus ?? null,
    Z2: two?.modulus ?? null,
    pna: x !== null && y !== null ? place(x, y) : null,
    equalForceAxis: fx !== null && fy !== null ? place(fx, fy) : null,
    Mp,
    squash: fx !== null ? fx.total : x !== null ? yieldStress * x.total : null,
  };
  return {
    values,
    absent: ALWAYS.filter((key) => values[key] === null).map((property) => ({
      property,
      code: "plastic.noAxis",
      detail: "No axis halves this area: look for outlines that cross themselves.",
    })),
    warnings: [
      ...gapWarnings(
        [
          ["x–x", x],
          ["y–y", y],
        ],
        "halves the area",
      ),
      ...gapWarnings(
        [
          ["x–x", fx],
          ["y–y", fy],
        ],
        "halves the yield force",
      ),
    ],
  };
};
