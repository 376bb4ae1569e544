import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { cosSinOfDegrees } from "@/lib/geometry/ring";
import type { Point } from "@/lib/geometry/region";
import type { Contact } from "@/lib/section/section";

/** Width over thickness of a plate element, from face to free edge or between faces; fillets and welds are left out. */
export type Slenderness = Readonly<{
  part: string;
  /** What of the part is meant: "plate", "flange", "web". */
  element: string;
  kind: "face to free edge" | "between faces" | "free on all sides" | "diameter over wall";
  width: number;
  thickness: number;
  ratio: number;
}>;

const fact = (
  part: string,
  element: string,
  kind: Slenderness["kind"],
  width: number,
  thickness: number,
): Slenderness[] =>
  width > 0 && thickness > 0 ? [{ part, element, kind, width, thickness, ratio: width / thickness }] : [];

/**
 * b/t facts of every part that has them. For a plate, contacts on its faces and ends tell how far it stands out freely and
 * how wide it runs between supports; both are given where both occur. No class is derived: that is the code's matter.
 */
export const slendernessOf = (drawing: Drawing, contacts: readonly Contact[]): Slenderness[] =>
  drawing.parts.flatMap((part) => {
    if (part.cutout === true) return [];
    const { shape } = part;
    switch (shape.kind) {
      case "plate":
        return plateFacts(part, shape.width, shape.height, contacts);
      case "round":
        return shape.wall === undefined
          ? []
          : fact(part.id, "wall", "diameter over wall", shape.diameter, shape.wall);
      case "outline":
        return [];
      case "profile":
        return profileFacts(part);
    }
  });

const plateFacts = (
  part: DrawingPart,
  width: number,
  height: number,
  contacts: readonly Contact[],
): Slenderness[] => {
  const long = Math.max(width, height);
  const t = Math.min(width, height);
  const held = heldStretches(part, width >= height, long, contacts);
  if (held.length === 0) return fact(part.id, "plate", "free on all sides", long, t);
  const slack = t * 1e-6;
  const free = Math.max((held[0]?.low ?? 0) + long / 2, long / 2 - (held.at(-1)?.high ?? 0));
  const between = held.slice(1).map((h, i) => h.low - (held[i]?.high ?? h.low));
  return [
    ...(free > slack ? fact(part.id, "plate", "face to free edge", free, t) : []),
    ...(between.length > 0 ? fact(part.id, "plate", "between faces", Math.max(...between), t) : []),
  ];
};

/** Stretches of the plate's length (from −long/2 to long/2) that other parts hold, joined where they overlap. */
const heldStretches = (
  part: DrawingPart,
  lengthIsWidth: boolean,
  long: number,
  contacts: readonly Contact[],
): { low: number; high: number }[] => {
  const [c, s] = cosSinOfDegrees(part.angle + (lengthIsWidth ? 0 : 90));
  const along = (p: Point) => (p.x - part.at.x) * c + (p.y - part.at.y) * s;
  const stretches = contacts
    .filter((contact) => contact.parts.includes(part.id))
    .flatMap((contact) => contact.lines)
    .map(({ from, to }) => ({
      low: Math.min(along(from), along(to)),
      high: Math.max(along(from), along(to)),
    }))
    .map(({ low, high }) => ({ low: Math.max(low, -long / 2), high: Math.min(high, long / 2) }))
    .sort((a, b) => a.low - b.low);
  return stretches.reduce<{ low: number; high: number }[]>((joined, next) => {
    const last = joined.at(-1);
    if (last && next.low <= last.high + long * 1e-9) last.high = Math.max(last.high, next.high);
    else joined.push({ ...next });
    return joined;
  }, []);
};

const profileFacts = (part: DrawingPart): Slenderness[] => {
  if (part.shape.kind !== "profile") return [];
  const { id } = part;
  const { family } = part.shape;
  switch (family) {
    case "i-section": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "flange", "face to free edge", (d.flangeWidth - d.webThickness) / 2, d.flangeThickness),
        ...fact(id, "web", "between faces", d.depth - 2 * d.flangeThickness, d.webThickness),
      ];
    }
    case "i-section-unequal": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "top flange", "face to free edge", (d.topWidth - d.webThickness) / 2, d.topThickness),
        ...fact(
          id,
          "bottom flange",
          "face to free edge",
          (d.bottomWidth - d.webThickness) / 2,
          d.bottomThickness,
        ),
        ...fact(id, "web", "between faces", d.depth - d.topThickness - d.bottomThickness, d.webThickness),
      ];
    }
    case "channel": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "flange", "face to free edge", d.flangeWidth - d.webThickness, d.flangeThickness),
        ...fact(id, "web", "between faces", d.depth - 2 * d.flangeThickness, d.webThickness),
      ];
    }
    case "tee": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "flange", "face to free edge", (d.flangeWidth - d.webThickness) / 2, d.flangeThickness),
        ...fact(id, "stem", "face to free edge", d.depth - d.flangeThickness, d.webThickness),
      ];
    }
    case "angle": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "upright leg", "face to free edge", d.legLong - d.thickness, d.thickness),
        ...fact(id, "level leg", "face to free edge", d.legShort - d.thickness, d.thickness),
      ];
    }
    case "rectangular-hollow": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "level wall", "between faces", d.width - 2 * d.thickness, d.thickness),
        ...fact(id, "upright wall", "between faces", d.depth - 2 * d.thickness, d.thickness),
      ];
    }
    case "round-hollow": {
      const d = part.shape.dimensions;
      return fact(id, "wall", "diameter over wall", d.diameter, d.thickness);
    }
    case "zee": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "flange", "face to free edge", d.flangeWidth - d.thickness, d.thickness),
        ...fact(id, "web", "between faces", d.depth - 2 * d.thickness, d.thickness),
      ];
    }
    case "lipped-channel": {
      const d = part.shape.dimensions;
      return [
        ...fact(id, "lip", "face to free edge", d.lip - d.thickness, d.thickness),
        ...fact(id, "flange", "between faces", d.flangeWidth - 2 * d.thickness, d.thickness),
        ...fact(id, "web", "between faces", d.depth - 2 * d.thickness, d.thickness),
      ];
    }
    case "flat":
    case "round":
    case "timber":
      return [];
  }
};
