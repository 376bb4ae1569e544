import type { Drawing, DrawingMaterial } from "@/lib/drawing/schema";

/** Structural steel: E 210,000 MPa, G 81,000 MPa, 7,850 kg/m³ (EN 1993-1-1, 3.2.6, from memory); fy is the user's to change. */
export const STEEL: DrawingMaterial = {
  id: "steel",
  name: "Steel",
  E: 210_000,
  G: 81_000,
  fy: 355,
  density: 7_850,
};

/** Softwood for flitch beams: common practice for structural softwood, to be replaced by the grade's own values. */
export const SOFTWOOD: DrawingMaterial = {
  id: "softwood",
  name: "Softwood",
  E: 11_000,
  G: 690,
  fy: 24,
  density: 420,
};

/** A drawing without parts. */
export const newDrawing = (): Drawing => ({
  version: 1,
  unit: "mm",
  reference: STEEL.id,
  materials: [STEEL],
  parts: [],
  joints: [],
});
