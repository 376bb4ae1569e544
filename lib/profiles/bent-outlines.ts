import type { FamilyDimensions } from "@/lib/profiles/families";
import { misfit } from "@/lib/profiles/fit";
import type { Corner } from "@/lib/profiles/rounded-ring";
import { ok, type Result } from "@/lib/result";

/**
 * The corners of the families bent from one thickness, anticlockwise, mm. The outer radius of a bend is its inner
 * radius plus the thickness, so that the wall stays even; an inner radius of 0 means sharp corners inside and outside.
 */
type Corners = Result<readonly Corner[]>;

const FIELD = "innerRadius";
const TOO_THICK = "The walls fill the section: make thickness smaller.";

const bends = (d: Readonly<{ innerRadius: number; thickness: number }>) => {
  const outer = d.innerRadius > 0 ? d.innerRadius + d.thickness : 0;
  return {
    outside: (x: number, y: number): Corner => ({ x, y, radius: outer, field: FIELD }),
    inside: (x: number, y: number): Corner => ({ x, y, radius: d.innerRadius, field: FIELD }),
  };
};

/** A zee: top flange towards +x, bottom flange towards −x, `flangeWidth` measured with the web. */
export const zeeCorners = (d: FamilyDimensions["zee"]): Corners => {
  const [h, b, t, w] = [d.depth, d.flangeWidth, d.thickness, d.thickness / 2];
  if (t >= b || 2 * t >= h) return misfit("thickness", TOO_THICK);
  const { outside, inside } = bends(d);
  return ok([
    { x: w - b, y: 0 },
    outside(w, 0),
    inside(w, h - t),
    { x: b - w, y: h - t },
    { x: b - w, y: h },
    outside(-w, h),
    inside(-w, t),
    { x: w - b, y: t },
  ]);
};

/** A lipped channel, web at −x; `flangeWidth` and `lip` are outside measures. */
export const lippedChannelCorners = (d: FamilyDimensions["lipped-channel"]): Corners => {
  const [h, b, t, lip] = [d.depth, d.flangeWidth, d.thickness, d.lip];
  if (2 * t >= b || 2 * t >= h) return misfit("thickness", TOO_THICK);
  if (lip <= t)
    return misfit("lip", "The lip is no longer than the wall is thick: make lip larger, or use a channel.");
  if (2 * lip >= h)
    return misfit("lip", "The two lips meet: make lip smaller, or use a rectangular hollow section.");
  const { outside, inside } = bends(d);
  return ok([
    outside(0, 0),
    outside(b, 0),
    { x: b, y: lip },
    { x: b - t, y: lip },
    inside(b - t, t),
    inside(t, t),
    inside(t, h - t),
    inside(b - t, h - t),
    { x: b - t, y: h - lip },
    { x: b, y: h - lip },
    outside(b, h),
    outside(0, h),
  ]);
};
