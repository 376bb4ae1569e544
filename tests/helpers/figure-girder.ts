import type { Ring } from "@/lib/geometry/region";
import type { FigurePart } from "@/lib/figure/figure-part";
import { boxOfRings } from "@/lib/figure/outline";

export const plateRing = (x: number, y: number, width: number, height: number): Ring => [
  { x: x - width / 2, y: y - height / 2 },
  { x: x + width / 2, y: y - height / 2 },
  { x: x + width / 2, y: y + height / 2 },
  { x: x - width / 2, y: y + height / 2 },
];

export const figurePart = (id: string, item: string, rings: readonly Ring[], inHand = false): FigurePart => ({
  id,
  item,
  rings,
  box: boxOfRings(rings) ?? { xMin: 0, xMax: 0, yMin: 0, yMax: 0 },
  cutout: false,
  plain: true,
  levels: [],
  timber: false,
  inHand,
});

/** A plate girder with a lip plate under its top flange; part 4 is in hand. */
export const girderParts: readonly FigurePart[] = [
  figurePart("tf", "1", [plateRing(0, 614, 420, 36)]),
  figurePart("web", "2", [plateRing(0, 314, 18, 564)]),
  figurePart("bf", "3", [plateRing(0, 16, 280, 32)]),
  figurePart("lip", "4", [plateRing(202, 496, 16, 200)], true),
];

export const girderTouching = [
  ["tf", "web"],
  ["web", "bf"],
  ["tf", "lip"],
] as const;
