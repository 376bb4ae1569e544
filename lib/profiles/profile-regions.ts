import { ringBox } from "@/lib/geometry/arc";
import type { Region } from "@/lib/geometry/region";
import { lippedChannelCorners, zeeCorners } from "@/lib/profiles/bent-outlines";
import {
  circleRing,
  rectangleRegions,
  rectangularHollowRegions,
  roundHollowRegions,
} from "@/lib/profiles/closed-outlines";
import type { Profile } from "@/lib/profiles/families";
import {
  angleCorners,
  channelCorners,
  iSectionCorners,
  teeCorners,
  unequalICorners,
} from "@/lib/profiles/open-outlines";
import { roundedRing, type Corner } from "@/lib/profiles/rounded-ring";
import { err, ok, type Fault, type Result } from "@/lib/result";

const centred = (corners: Result<readonly Corner[]>): Result<readonly Region[]> => {
  if (!corners.ok) return err(corners.error);
  const ring = roundedRing(corners.value);
  if (!ring.ok) return err(ring.error);
  const box = ringBox(ring.value);
  if (box === null) return err({ code: "profile.noOutline", detail: "This profile has no outline." });
  const [cx, cy] = [(box.xMin + box.xMax) / 2, (box.yMin + box.yMax) / 2];
  return ok([{ outer: ring.value.map((v) => ({ ...v, x: v.x - cx, y: v.y - cy })), holes: [] }]);
};

/** Dimensions that may be 0; every other one is a size. */
const MAY_BE_ZERO: ReadonlySet<string> = new Set([
  "rootRadius",
  "toeRadius",
  "innerRadius",
  "outerRadius",
  "flangeSlope",
  "thicknessAt",
]);

const badDimension = (profile: Profile): Fault | null => {
  for (const [field, value] of Object.entries(profile.dimensions)) {
    if (value === undefined) continue;
    const enough = MAY_BE_ZERO.has(field) ? value >= 0 : value > 0;
    if (!Number.isFinite(value) || !enough)
      return {
        code: "profile.badDimension",
        detail: `${field} must be ${MAY_BE_ZERO.has(field) ? "0 or more" : "greater than 0"}: correct it.`,
        pointer: `/dimensions/${field}`,
      };
  }
  return null;
};

const regionsOf = (profile: Profile): Result<readonly Region[]> => {
  switch (profile.family) {
    case "i-section":
      return centred(iSectionCorners(profile.dimensions));
    case "i-section-unequal":
      return centred(unequalICorners(profile.dimensions));
    case "channel":
      return centred(channelCorners(profile.dimensions));
    case "angle":
      return centred(angleCorners(profile.dimensions));
    case "tee":
      return centred(teeCorners(profile.dimensions));
    case "zee":
      return centred(zeeCorners(profile.dimensions));
    case "lipped-channel":
      return centred(lippedChannelCorners(profile.dimensions));
    case "rectangular-hollow":
      return rectangularHollowRegions(profile.dimensions);
    case "round-hollow":
      return roundHollowRegions(profile.dimensions);
    case "flat":
      return rectangleRegions(profile.dimensions.width, profile.dimensions.thickness);
    case "timber":
      return rectangleRegions(profile.dimensions.width, profile.dimensions.depth);
    case "round":
      return ok([{ outer: circleRing(profile.dimensions.diameter), holes: [] }]);
  }
};

/**
 * The outline of a profile with its fillets, toe radii and slopes, as lines and true arcs.
 * @param profile family and dimensions, mm (design: Formats, Families).
 * @returns regions about the centre of the bounding box, x right, y up, mm; or a fault whose `pointer` names the
 * dimension (`/dimensions/rootRadius`): `profile.badDimension` for one that is no length, `profile.doesNotFit` for one
 * that does not go with the others.
 */
export const profileRegions = (profile: Profile): Result<readonly Region[]> => {
  const bad = badDimension(profile);
  return bad === null ? regionsOf(profile) : err(bad);
};
