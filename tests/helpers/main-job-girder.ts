import type { Drawing } from "@/lib/drawing/schema";

/** An equal-flanged plate girder: two flanges 180 × 12, web 8 × 476, depth 500 mm. */
export const GIRDER = { depth: 500, flange: { width: 180, thickness: 12 }, web: 8 } as const;
const { depth, flange, web } = GIRDER;
const webHeight = depth - 2 * flange.thickness;

/** Closed forms: A = 2bt + hw·tw; Ix = [b·d³ − (b − tw)·hw³]/12; Sx = 2Ix/d; Iy = 2·t·b³/12 + hw·tw³/12; Zx = b·t·(d − t) + tw·hw²/4. */
export const GIRDER_FIGURES = {
  area: 2 * flange.width * flange.thickness + webHeight * web,
  Ix: (flange.width * depth ** 3 - (flange.width - web) * webHeight ** 3) / 12,
  Sx: (flange.width * depth ** 3 - (flange.width - web) * webHeight ** 3) / 6 / depth,
  Iy: (2 * flange.thickness * flange.width ** 3 + webHeight * web ** 3) / 12,
  Zx: flange.width * flange.thickness * (depth - flange.thickness) + (web * webHeight ** 2) / 4,
  mass: ((2 * flange.width * flange.thickness + webHeight * web) * 7850) / 1e6,
} as const;

export const girderDrawing = (): Drawing => {
  const plate = (id: string, name: string, y: number, width: number, height: number) => ({
    id,
    name,
    material: "steel",
    at: { x: 0, y },
    angle: 0,
    shape: { kind: "plate" as const, width, height },
  });
  return {
    version: 1,
    unit: "mm",
    reference: "steel",
    materials: [{ id: "steel", name: "Steel", E: 210_000, G: 81_000, fy: 355, density: 7850 }],
    parts: [
      plate("top", "Top flange", depth - flange.thickness / 2, flange.width, flange.thickness),
      plate("web", "Web", depth / 2, web, webHeight),
      plate("bottom", "Bottom flange", flange.thickness / 2, flange.width, flange.thickness),
    ],
    joints: [],
  };
};
