import type { Drawing } from "@/lib/drawing/schema";
import { SHAPE_FAMILIES, type ShapeFamily } from "@/lib/schemas/shape";

const isFamily = (name: string): name is ShapeFamily => (SHAPE_FAMILIES as readonly string[]).includes(name);

const OF_STARTER: Readonly<Record<string, ShapeFamily>> = {
  "plate-channel": "built-up",
  tube: "round-hollow",
};

/** The family a drawing is filed under: its one profile's, its starter's, built-up of several parts, else custom. */
export const familyOf = (drawing: Drawing): ShapeFamily => {
  const solids = drawing.parts.flatMap((p) => (p.cutout === true ? [] : [p]));
  const [only] = solids;
  if (only && solids.length === 1) {
    if (only.shape.kind === "profile") return only.shape.family;
    if (only.shape.kind === "round") return only.shape.wall === undefined ? "round" : "round-hollow";
    if (only.shape.kind === "plate") return "flat";
    return "custom";
  }
  const starters = new Set(solids.map((p) => String(p.starter?.kind ?? "")));
  const [kind = ""] = starters;
  if (starters.size === 1 && kind) return OF_STARTER[kind] ?? (isFamily(kind) ? kind : "built-up");
  return solids.some((p) => p.shape.kind === "outline") ? "custom" : "built-up";
};
