import type { Drawing, DrawingMaterial } from "@/lib/drawing/schema";
import type { Profile } from "@/lib/profiles/families";
import type { Reading } from "@/lib/intake/schema";

/** Steel of EN 10365: 7850 kg/m³ (US tables: 490 lb/ft³, 0.01 % less). The strength of stock is not part of a table of sizes. */
const STEEL: DrawingMaterial = {
  id: "steel",
  name: "Steel, grade not stated",
  E: 210_000,
  G: 81_000,
  fy: 235,
  density: 7850,
};

/** Softwood, mean values of C24 after EN 338 (from memory). */
const TIMBER: DrawingMaterial = {
  id: "timber",
  name: "Timber, grade not stated",
  E: 11_000,
  G: 690,
  fy: 24,
  density: 420,
};

export const STOCK_MATERIAL: Record<Reading["material"], DrawingMaterial> = { steel: STEEL, timber: TIMBER };

/** A profile from a table is a drawing of one part, its bounding box centred on the origin. */
export function stockDrawing(profile: Profile, designation: string, material: Reading["material"]): Drawing {
  const stock = STOCK_MATERIAL[material];
  return {
    version: 1,
    unit: "mm",
    reference: stock.id,
    materials: [stock],
    parts: [
      {
        id: "p1",
        name: designation,
        material: stock.id,
        at: { x: 0, y: 0 },
        angle: 0,
        // Safe cast: `Profile` is the union of family with its own dimensions, which is what the schema of a profile part is.
        shape: { kind: "profile", ...profile } as Drawing["parts"][number]["shape"],
      },
    ],
    joints: [],
  };
}
