/**
 * The tolerances of geometry, in one place. Lengths are mm: drawings hold plates of 1 mm to 10 m and no size below 1 µm,
 * so that a fixed length is a share of a stated size here.
 */

/** Vertices of different parts nearer than this, and a vertex nearer than this to another part's edge, touch: a tenth of
 * the smallest size a drawing may hold. */
export const TOUCH_MM = 1e-4;

/** Corners of one ring nearer than this share of its extent are one point: a nanometre on a metre. */
export const SAME_POINT_REL = 1e-9;

/** A ring encloses no area when |A| is at most this share of the square of its extent: a strip of 1 µm on 1 m has 1e-6. */
export const NO_AREA_REL = 1e-9;

/** Steps of the grid that vertices are snapped to before clipping, mm: powers of two, so that snapping adds no rounding of
 * its own. The first serves nearly always; the rest are retries when the clipper fails. */
export const SNAP_STEPS_MM = [2 ** -20, 2 ** -18, 2 ** -16, 2 ** -14, 2 ** -12] as const;

/** Share by which |A∪B| + |A∩B| may differ from |A| + |B| before a clip counts as failed. */
export const AREA_IDENTITY_REL = 1e-9;

/** Chords to a full circle where an arc has to be clipped: area-matched, the area of a circle is off by rounding only and
 * that of a part cut from it by about 1e-8. */
export const CHORDS_PER_CIRCLE = 1024;
