import { DrawingV1, type Drawing, type PartShape } from "@/lib/drawing/schema";
import type { Profile } from "@/lib/profiles/families";

/** A drawing of these shapes in steel, each placed with its origin at `at`; checked like any drawing that comes in. */
export const steelDrawing = (
  ...shapes: readonly Readonly<{ shape: PartShape; at?: { x: number; y: number }; angle?: number }>[]
): Drawing =>
  DrawingV1.parse({
    version: 1,
    unit: "mm",
    reference: "steel",
    materials: [{ id: "steel", name: "Steel", E: 210_000, G: 81_000, fy: 355, density: 7850 }],
    parts: shapes.map(({ shape, at = { x: 0, y: 0 }, angle = 0 }, i) => ({
      id: `p${i + 1}`,
      name: `Part ${i + 1}`,
      material: "steel",
      at,
      angle,
      shape,
    })),
  });

/** A drawing of one profile about the origin. */
export const profileDrawing = (profile: Profile): Drawing =>
  steelDrawing({ shape: { kind: "profile", ...profile } as PartShape });
