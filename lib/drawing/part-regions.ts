import type { PartShape } from "@/lib/drawing/schema";
import { checkRings } from "@/lib/geometry/check-rings";
import { MAX_LENGTH_MM, MIN_SIZE_MM } from "@/lib/geometry/limits";
import type { Region, Ring } from "@/lib/geometry/region";
import { orientRing } from "@/lib/geometry/ring";
import { profileRegions } from "@/lib/profiles/profile-regions";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";

const rectangle = (width: number, height: number): Ring => [
  { x: -width / 2, y: -height / 2 },
  { x: width / 2, y: -height / 2 },
  { x: width / 2, y: height / 2 },
  { x: -width / 2, y: height / 2 },
];

const circle = (radius: number): Ring => [
  { x: radius, y: 0, bulge: 1 },
  { x: -radius, y: 0, bulge: 1 },
];

/** The schema refuses these already; a drawing that was changed in memory comes here without it. */
const badSize = (sizes: Readonly<Record<string, number | undefined>>): Fault | null => {
  for (const [field, size] of Object.entries(sizes)) {
    if (size === undefined || (size >= MIN_SIZE_MM && size <= MAX_LENGTH_MM)) continue;
    const detail = `The ${field} is ${size}, but must lie between ${MIN_SIZE_MM} and ${MAX_LENGTH_MM} mm. Type it again.`;
    return { code: "part.badSize", detail, pointer: `/${field}` };
  }
  return null;
};

const roundRegions = (diameter: number, wall: number | undefined): Result<readonly Region[], Fault> => {
  const bad = badSize({ diameter, wall });
  if (bad !== null) return err(bad);
  const outer = circle(diameter / 2);
  if (wall === undefined) return ok([{ outer, holes: [] }]);
  if (2 * wall >= diameter)
    return err({
      code: "round.noBore",
      detail: `A wall of ${wall} mm leaves no bore in a diameter of ${diameter} mm. Make the wall thinner, or leave it out for a solid round.`,
      pointer: "/wall",
    });
  return ok([{ outer, holes: [orientRing(circle(diameter / 2 - wall), "hole")] }]);
};

const ringPointer = (ring: number): string => (ring === 0 ? "/outer" : `/holes/${ring - 1}`);

const outlineRegions = (outer: Ring, holes: readonly Ring[]): Result<readonly Region[], readonly Fault[]> => {
  const checked = checkRings([outer, ...holes]);
  if (!checked.ok)
    return err(
      checked.error.map(({ code, detail, ring, edge }) => ({
        code,
        detail,
        pointer: ringPointer(ring) + (edge === undefined ? "" : `/${edge}`),
      })),
    );
  return ok([checked.value]);
};

/**
 * The regions of a shape about its own origin, mm: the centre of a plate, a round or a profile's bounding box, (0, 0) of
 * an outline. Outlines may be drawn in either direction.
 * @returns faults with pointers relative to the shape ("/outer/3") for what cannot be a section: no bore, an outline that
 * crosses itself, a ring without area, a profile whose dimensions do not fit together.
 */
export const shapeRegions = (shape: PartShape): Result<readonly Region[], readonly Fault[]> => {
  switch (shape.kind) {
    case "plate": {
      const bad = badSize({ width: shape.width, height: shape.height });
      return bad === null ? ok([{ outer: rectangle(shape.width, shape.height), holes: [] }]) : err([bad]);
    }
    case "round": {
      const round = roundRegions(shape.diameter, shape.wall);
      return round.ok ? round : err([round.error]);
    }
    case "outline":
      return outlineRegions(shape.outer as Ring, shape.holes as readonly Ring[]);
    case "profile": {
      const regions = profileRegions(shape);
      return regions.ok ? regions : err([regions.error]);
    }
    default:
      return shape satisfies never;
  }
};
