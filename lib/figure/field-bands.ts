import type { GreatestStress, StressFields } from "@/lib/section/torsion/stress-fields";

export type FieldName = "torsion" | "shearX" | "shearY";

/** One shade of the picture: stresses from `from` to `to`, and its triangles as the data of an SVG path (mm, y down). */
export type FieldBand = Readonly<{ from: number; to: number; path: string }>;

/** A picture of the size of a shear stress, with the box it fills (x, y of its top left corner with y down; mm). */
export type FieldPicture = Readonly<{
  bands: readonly FieldBand[];
  box: Readonly<{ x: number; y: number; width: number; height: number }>;
  greatest: GreatestStress;
  excludedCorners: number;
}>;

/** Coordinates are rounded to this share of the larger side: a fifth of a pixel on a picture of 400. */
const ROUND_REL = 5e-4;

/**
 * Bands of equal width from 0 to the greatest stress, each element piece in the band of its mean. What lies above the
 * greatest (round re-entrant corners, where the stress has no finite value) stands in the last band.
 * @param count number of bands, 1 or more.
 */
export const fieldBands = (fields: StressFields, name: FieldName, count: number): FieldPicture => {
  const { x, y, triangles } = fields;
  const stress = fields[name];
  const greatest = fields.greatest[name];
  let [xMin, xMax, yMin, yMax] = [Infinity, -Infinity, Infinity, -Infinity];
  for (let i = 0; i < x.length; i++) {
    xMin = Math.min(xMin, x[i]!);
    xMax = Math.max(xMax, x[i]!);
    yMin = Math.min(yMin, y[i]!);
    yMax = Math.max(yMax, y[i]!);
  }
  const decimals = Math.max(0, Math.ceil(-Math.log10(ROUND_REL * Math.max(xMax - xMin, yMax - yMin))));
  const place = (i: number): string =>
    `${Number(x[i]!.toFixed(decimals))} ${Number((-y[i]!).toFixed(decimals))}`;
  const sizeAt = (i: number): number => Math.hypot(stress.x[i]!, stress.y[i]!);
  const paths: string[][] = Array.from({ length: count }, () => []);
  for (let t = 0; t < triangles.length; t += 3) {
    const [a, b, c] = [triangles[t]!, triangles[t + 1]!, triangles[t + 2]!];
    const mean = (sizeAt(a) + sizeAt(b) + sizeAt(c)) / 3;
    const level = greatest.value > 0 ? Math.floor((count * mean) / greatest.value) : 0;
    paths[Math.min(count - 1, level)]!.push(`M${place(a)}L${place(b)} ${place(c)}Z`);
  }
  const step = greatest.value / count;
  return {
    bands: paths.map((pieces, i) => ({ from: i * step, to: (i + 1) * step, path: pieces.join("") })),
    box: { x: xMin, y: -yMax, width: xMax - xMin, height: yMax - yMin },
    greatest,
    excludedCorners: fields.excludedCorners,
  };
};
