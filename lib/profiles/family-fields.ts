import type { Family } from "@/lib/profiles/families";

/** What each dimension of a family is called. */
export const DIMENSION_NAME: Readonly<Record<string, string>> = {
  depth: "Depth",
  width: "Width",
  flangeWidth: "Flange width",
  webThickness: "Web thickness",
  flangeThickness: "Flange thickness",
  rootRadius: "Root radius",
  topWidth: "Top width",
  topThickness: "Top thickness",
  bottomWidth: "Bottom width",
  bottomThickness: "Bottom thickness",
  legLong: "Upright leg",
  legShort: "Level leg",
  thickness: "Thickness",
  toeRadius: "Toe radius",
  innerRadius: "Inner radius",
  outerRadius: "Outer radius",
  diameter: "Diameter",
  lip: "Lip",
  flangeSlope: "Flange slope",
  thicknessAt: "Thickness holds at",
};

/** Families in words, as the trade calls them. */
export const PROFILE_NAME: Readonly<Record<Family, string>> = {
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
};

/** Sizes a new profile of a family starts with, mm: plausible ones of no table. */
export const FIRST_DIMENSIONS: Readonly<Record<Family, Readonly<Record<string, number>>>> = {
  "i-section": { depth: 300, flangeWidth: 150, webThickness: 7, flangeThickness: 11, rootRadius: 15 },
  "i-section-unequal": {
    depth: 400,
    topWidth: 200,
    topThickness: 16,
    bottomWidth: 160,
    bottomThickness: 12,
    webThickness: 8,
    rootRadius: 0,
  },
  channel: { depth: 200, flangeWidth: 75, webThickness: 8, flangeThickness: 11, rootRadius: 11 },
  angle: { legLong: 100, legShort: 75, thickness: 8, rootRadius: 10, toeRadius: 5 },
  tee: { depth: 150, flangeWidth: 150, webThickness: 7, flangeThickness: 11, rootRadius: 15 },
  zee: { depth: 200, flangeWidth: 70, thickness: 6, innerRadius: 6 },
  "rectangular-hollow": { depth: 200, width: 100, thickness: 8, outerRadius: 12, innerRadius: 8 },
  "round-hollow": { diameter: 168.3, thickness: 8 },
  flat: { width: 100, thickness: 10 },
  round: { diameter: 50 },
  "lipped-channel": { depth: 200, flangeWidth: 65, lip: 20, thickness: 2, innerRadius: 3 },
  timber: { width: 60, depth: 240 },
};
