import type { Point } from "@/lib/geometry/region";
import type { Absent } from "@/lib/section/properties";
import type { SectionWarning } from "@/lib/section/section";
import type { JointFlow } from "@/lib/section/torsion/joint-flows";
import type { StressFields } from "@/lib/section/torsion/stress-fields";

/**
 * Relative error estimates: of J (half the distance of its bounds), of Cw, of the shear centre (over the polar radius of
 * gyration r_p) and of the shear areas. Null where the value is.
 */
export type TorsionEstimates = Readonly<{
  J: number;
  Cw: number | null;
  shearCentre: number | null;
  Avx: number | null;
  Avy: number | null;
}>;

/**
 * Torsion and shear properties of a section, transformed to the reference material: J by G/G_ref, the rest by E/E_ref.
 * J in mm⁴ with its bounds; Cw in mm⁶; shear centre in drawing coordinates, mm; shear areas for deflection Avx, Avy in mm²
 * (energy, ν = 0; not the web area for strength); monosymmetry constants betaX, betaY and polar radius r0 about the shear
 * centre in mm. `bodies` that are not connected give the sum of their J and null, with the reason in `absent`, for the rest.
 */
export type TorsionProperties = Readonly<{
  J: number;
  JBounds: Readonly<{ lower: number; upper: number }>;
  Cw: number | null;
  shearCentre: Point | null;
  Avx: number | null;
  Avy: number | null;
  betaX: number | null;
  betaY: number | null;
  r0: number | null;
  estimates: TorsionEstimates;
  bodies: number;
  /** Longitudinal shear along each line where parts touch; empty when the section is not connected. */
  joints: readonly JointFlow[];
  /** Stress fields, where they were asked for and the section is connected. */
  fields: StressFields | null;
  mesh: Readonly<{ vertices: number; triangles: number; degree: number }>;
  absent: readonly Absent[];
  warnings: readonly SectionWarning[];
}>;
