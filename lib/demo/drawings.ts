import type { Drawing, DrawingMaterial, DrawingPart } from "@/lib/drawing/schema";
import type { Profile } from "@/lib/profiles/families";

/** Invented grades: they are named by their stress and claim no standard. Common practice for E, G and density. */
export const STEEL: DrawingMaterial = {
  id: "steel-355",
  name: "Steel, fy 355",
  E: 210_000,
  G: 81_000,
  fy: [
    { upTo: 16, fy: 355 },
    { upTo: 40, fy: 345 },
    { upTo: 63, fy: 335 },
  ],
  density: 7850,
};

export const SOFTWOOD: DrawingMaterial = {
  id: "softwood",
  name: "Softwood, stress graded",
  E: 11_000,
  G: 690,
  fy: 24,
  density: 420,
};

type Placed = Readonly<{ name: string; x: number; y: number; angle?: number; material?: DrawingMaterial }>;

const part = (id: string, placed: Placed, shape: DrawingPart["shape"]): DrawingPart => ({
  id,
  name: placed.name,
  material: (placed.material ?? STEEL).id,
  at: { x: placed.x, y: placed.y },
  angle: placed.angle ?? 0,
  shape,
});

export const plate = (id: string, placed: Placed, width: number, height: number): DrawingPart =>
  part(id, placed, { kind: "plate", width, height });

export const profilePart = (id: string, placed: Placed, profile: Profile): DrawingPart =>
  part(id, placed, { kind: "profile", ...profile } as DrawingPart["shape"]);

type DrawingOptions = Readonly<{
  materials?: readonly DrawingMaterial[];
  /** Fillet welds of this leg, mm, on both sides between each named pair. */
  fillets?: Readonly<{ leg: number; between: readonly (readonly [string, string])[] }>;
}>;

export const drawingOf = (
  parts: readonly DrawingPart[],
  { materials = [STEEL], fillets }: DrawingOptions = {},
): Drawing => ({
  version: 1,
  unit: "mm",
  reference: materials[0]!.id,
  materials: [...materials],
  parts: [...parts],
  joints: (fillets?.between ?? []).map(([a, b]) => ({
    between: [a, b],
    kind: "fillet",
    measure: "leg",
    size: fillets!.leg,
    sides: 2,
  })),
});

/** A drawing of one rolled profile, standing at the origin. */
export const profileDrawing = (name: string, profile: Profile): Drawing =>
  drawingOf([profilePart("profile", { name, x: 0, y: 0 }, profile)]);
