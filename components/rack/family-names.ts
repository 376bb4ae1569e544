import type { ShapeFamily } from "@/lib/schemas/shape";

/** Families in words, in the order in which a filter offers them. */
export const FAMILY_NAME: Record<ShapeFamily, string> = {
  "i-section": "I-section",
  "i-section-unequal": "I-section, unequal",
  channel: "Channel",
  angle: "Angle",
  tee: "Tee",
  zee: "Zee",
  "rectangular-hollow": "Rectangular hollow",
  "round-hollow": "Round hollow",
  flat: "Flat",
  round: "Round",
  "lipped-channel": "Lipped channel",
  timber: "Timber",
  "plate-girder": "Plate girder",
  "plate-girder-unequal": "Plate girder, unequal",
  "crane-girder": "Crane girder",
  "box-girder": "Box",
  "cover-plated-beam": "Cover-plated beam",
  "double-angle": "Double angle",
  "twin-channel": "Twin channel",
  cruciform: "Cruciform",
  "flitch-beam": "Flitch beam",
  "built-up": "Built-up",
  custom: "Custom",
};

export const FAMILIES = Object.keys(FAMILY_NAME) as ShapeFamily[];
