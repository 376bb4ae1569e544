import type { FamilyDimensions } from "@/lib/profiles/families";
import { misfit } from "@/lib/profiles/fit";
import type { Corner } from "@/lib/profiles/rounded-ring";
import { ok, type Result } from "@/lib/result";

/**
 * The corners of the open rolled families, anticlockwise, mm; x from the web's centre line (I, tee) or from the back of
 * the web or heel (channel, angle), y from the underside. Each answers `profile.doesNotFit` with the field at fault.
 */
type Corners = Result<readonly Corner[]>;

const root = (x: number, y: number, radius: number): Corner => ({ x, y, radius, field: "rootRadius" });
const toe = (x: number, y: number, radius: number): Corner => ({ x, y, radius, field: "toeRadius" });

const TOO_THICK_FLANGES = "The flanges fill the whole depth: make flangeThickness smaller or depth larger.";
const WEB_FILLS_FLANGE =
  "The web is as thick as the flange is wide: make webThickness smaller or flangeWidth larger.";
const NO_TOE_LEFT =
  "The slope leaves no thickness at the toe: make flangeSlope smaller or flangeThickness larger.";

/**
 * An I with equal flanges. With `flangeSlope` the inner faces fall towards the toes, and `flangeThickness` holds at
 * `thicknessAt` from the web's centre line, by default a quarter of the flange width: the middle of each half flange.
 */
export const iSectionCorners = (d: FamilyDimensions["i-section"]): Corners => {
  const slope = d.flangeSlope ?? 0;
  const at = d.thicknessAt ?? d.flangeWidth / 4;
  const [half, web] = [d.flangeWidth / 2, d.webThickness / 2];
  const tip = d.flangeThickness - slope * (half - at);
  const base = d.flangeThickness + slope * (at - web);
  if (web >= half) return misfit("webThickness", WEB_FILLS_FLANGE);
  if (at > half)
    return misfit("thicknessAt", "thicknessAt lies beyond the toe: make it at most half of flangeWidth.");
  if (tip <= 0) return misfit("flangeSlope", NO_TOE_LEFT);
  if (2 * base >= d.depth) return misfit("flangeThickness", TOO_THICK_FLANGES);
  const [h, r, r2] = [d.depth, d.rootRadius, d.toeRadius ?? 0];
  return ok([
    { x: -half, y: 0 },
    { x: half, y: 0 },
    toe(half, tip, r2),
    root(web, base, r),
    root(web, h - base, r),
    toe(half, h - tip, r2),
    { x: half, y: h },
    { x: -half, y: h },
    toe(-half, h - tip, r2),
    root(-web, h - base, r),
    root(-web, base, r),
    toe(-half, tip, r2),
  ]);
};

/** An I whose flanges differ; square toes, parallel faces. */
export const unequalICorners = (d: FamilyDimensions["i-section-unequal"]): Corners => {
  const [top, bottom, web] = [d.topWidth / 2, d.bottomWidth / 2, d.webThickness / 2];
  const WIDER = "The web is as thick as this flange is wide: make webThickness smaller or the flange wider.";
  if (web >= top) return misfit("topWidth", WIDER);
  if (web >= bottom) return misfit("bottomWidth", WIDER);
  const [h, r, t1, t2] = [d.depth, d.rootRadius, d.topThickness, d.bottomThickness];
  if (t1 + t2 >= h)
    return misfit("depth", "The flanges fill the whole depth: make depth larger or the flanges thinner.");
  return ok([
    { x: -bottom, y: 0 },
    { x: bottom, y: 0 },
    { x: bottom, y: t2 },
    root(web, t2, r),
    root(web, h - t1, r),
    { x: top, y: h - t1 },
    { x: top, y: h },
    { x: -top, y: h },
    { x: -top, y: h - t1 },
    root(-web, h - t1, r),
    root(-web, t2, r),
    { x: -bottom, y: t2 },
  ]);
};

/**
 * A channel, web at −x. With `flangeSlope` the inner faces fall towards the toes, and `flangeThickness` holds at
 * `thicknessAt` from the back of the web, by default the middle of `flangeWidth`.
 */
export const channelCorners = (d: FamilyDimensions["channel"]): Corners => {
  const slope = d.flangeSlope ?? 0;
  const at = d.thicknessAt ?? d.flangeWidth / 2;
  const tip = d.flangeThickness - slope * (d.flangeWidth - at);
  const base = d.flangeThickness + slope * (at - d.webThickness);
  if (d.webThickness >= d.flangeWidth) return misfit("webThickness", WEB_FILLS_FLANGE);
  if (at > d.flangeWidth)
    return misfit("thicknessAt", "thicknessAt lies beyond the toe: make it at most flangeWidth.");
  if (tip <= 0) return misfit("flangeSlope", NO_TOE_LEFT);
  if (2 * base >= d.depth) return misfit("flangeThickness", TOO_THICK_FLANGES);
  const [b, h, tw, r, r2] = [d.flangeWidth, d.depth, d.webThickness, d.rootRadius, d.toeRadius ?? 0];
  return ok([
    { x: 0, y: 0 },
    { x: b, y: 0 },
    toe(b, tip, r2),
    root(tw, base, r),
    root(tw, h - base, r),
    toe(b, h - tip, r2),
    { x: b, y: h },
    { x: 0, y: h },
  ]);
};

/**
 * An angle: the long leg stands along y, the short leg lies along x, the heel is lower left and sharp. A short leg
 * longer than the long one is refused, since it is most often a pair of exchanged columns; turn the part instead.
 */
export const angleCorners = (d: FamilyDimensions["angle"]): Corners => {
  const [a, b, t, r2] = [d.legLong, d.legShort, d.thickness, d.toeRadius];
  if (b > a)
    return misfit("legShort", "legShort is longer than legLong: exchange them, and turn the part if needed.");
  if (t >= b)
    return misfit("thickness", "The legs are no longer than they are thick: make thickness smaller.");
  return ok([
    { x: 0, y: 0 },
    { x: b, y: 0 },
    toe(b, t, r2),
    root(t, t, d.rootRadius),
    toe(t, a, r2),
    { x: 0, y: a },
  ]);
};

/** A tee, flange on top, square toes. */
export const teeCorners = (d: FamilyDimensions["tee"]): Corners => {
  const [half, web, h] = [d.flangeWidth / 2, d.webThickness / 2, d.depth];
  if (web >= half) return misfit("webThickness", WEB_FILLS_FLANGE);
  if (d.flangeThickness >= h)
    return misfit("flangeThickness", "The flange fills the whole depth: make flangeThickness smaller.");
  const under = h - d.flangeThickness;
  return ok([
    { x: -web, y: 0 },
    { x: web, y: 0 },
    root(web, under, d.rootRadius),
    { x: half, y: under },
    { x: half, y: h },
    { x: -half, y: h },
    { x: -half, y: under },
    root(-web, under, d.rootRadius),
  ]);
};
