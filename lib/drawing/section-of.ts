import { checkDrawing } from "@/lib/drawing/check-drawing";
import { jointWarnings } from "@/lib/drawing/check-joints";
import { shapeRegions } from "@/lib/drawing/part-regions";
import { resolveMaterial, thicknessOf } from "@/lib/drawing/part-thickness";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { arrange } from "@/lib/geometry/arrange";
import type { ArrangeCutout, Arrangement, Notice, SharedLine } from "@/lib/geometry/arrange-types";
import type { Point, Region } from "@/lib/geometry/region";
import { moveRegion, placeRegion } from "@/lib/geometry/ring";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import type { Material, Section, SectionPart } from "@/lib/section/section";

type SolidPart = Extract<DrawingPart, { material: string }>;

/** A part placed about the working origin, with what its material is there. */
type Solid = Readonly<{ part: SectionPart; materialId: string; warnings: readonly Notice[] }>;

const nameOf = (part: DrawingPart): string => part.name || part.id;

/** The least corner of all parts' `at`: near the drawing, and moving with it exactly, whatever the order of parts. */
const originOf = (parts: readonly DrawingPart[]): Point => {
  let [x, y] = [Infinity, Infinity];
  for (const { at } of parts) [x, y] = [Math.min(x, at.x), Math.min(y, at.y)];
  return Number.isFinite(x) && Number.isFinite(y) ? { x, y } : { x: 0, y: 0 };
};

const placedRegions = (
  part: DrawingPart,
  index: number,
  origin: Point,
): Result<readonly Region[], readonly Fault[]> => {
  const badPlace = (["x", "y"] as const).find((axis) => !Number.isFinite(part.at[axis]));
  const misplaced =
    badPlace === undefined ? (Number.isFinite(part.angle) ? null : "angle") : `at/${badPlace}`;
  if (misplaced !== null)
    return err([
      {
        code: "part.notFinite",
        detail: `${nameOf(part)}: its place and angle must be finite numbers. Type them again.`,
        part: part.id,
        pointer: `/parts/${index}/${misplaced}`,
      },
    ]);
  const regions = shapeRegions(part.shape);
  if (!regions.ok)
    return err(
      regions.error.map(({ code, detail, pointer = "" }) => ({
        code,
        detail: `${nameOf(part)}: ${detail}`,
        part: part.id,
        pointer: `/parts/${index}/shape${pointer}`,
      })),
    );
  const at = { x: part.at.x - origin.x, y: part.at.y - origin.y };
  const placement = { at, angle: part.angle, mirror: part.mirror };
  return ok(regions.value.map((region) => placeRegion(region, placement)));
};

const solidOf = (
  drawing: Drawing,
  part: SolidPart,
  index: number,
  origin: Point,
): Result<Solid, readonly Fault[]> => {
  const regions = placedRegions(part, index, origin);
  if (!regions.ok) return regions;
  const thickness = thicknessOf(part.shape);
  const material = materialOf(drawing, part.material, thickness);
  if (!material.ok) return err([{ ...material.error, part: part.id, pointer: `/parts/${index}/material` }]);
  const { value } = material;
  const least = `${nameOf(part)} is an outline without one thickness: the least yield strength of ${value.material.name} is taken.`;
  return ok({
    part: {
      id: part.id,
      name: nameOf(part),
      material: value.material,
      counts: part.counts === "mass" ? "mass" : "stiffness and mass",
      regions: regions.value,
      thickness,
    },
    materialId: part.material,
    warnings: value.leastBand ? [{ code: "fy.leastBand", detail: least, parts: [part.id] }] : [],
  });
};

const materialOf = (drawing: Drawing, id: string, thickness: number | null) => {
  const material = drawing.materials.find((m) => m.id === id);
  if (material === undefined)
    return err({ code: "part.unknownMaterial", detail: `The drawing has no material "${id}".` });
  return resolveMaterial(material, thickness);
};

type Placed = Readonly<{ solids: readonly Solid[]; cutouts: readonly ArrangeCutout[] }>;

const placeAll = (drawing: Drawing, origin: Point): Result<Placed, readonly Fault[]> => {
  const solids: Solid[] = [];
  const cutouts: ArrangeCutout[] = [];
  const faults: Fault[] = [];
  for (const [index, part] of drawing.parts.entries()) {
    if (part.cutout === true) {
      const regions = placedRegions(part, index, origin);
      if (regions.ok) cutouts.push({ id: part.id, name: nameOf(part), regions: regions.value });
      else faults.push(...regions.error);
    } else {
      const solid = solidOf(drawing, part, index, origin);
      if (!solid.ok) faults.push(...solid.error);
      else if (part.counts !== "nothing") solids.push(solid.value);
    }
  }
  return faults.length > 0 ? err(faults) : ok({ solids, cutouts });
};

const nothingStiff = (code: string, detail: string): Result<never, readonly Fault[]> =>
  err([{ code, detail, pointer: "/parts" }]);

const moveLine = ({ from, to, ...rest }: SharedLine, { x, y }: Point): SharedLine => ({
  from: { x: from.x + x, y: from.y + y },
  to: { x: to.x + x, y: to.y + y },
  ...rest,
});

const sectionFrom = (
  solids: readonly Solid[],
  arranged: Arrangement,
  reference: Material,
  origin: Point,
): Section => {
  const move = (regions: readonly Region[]) =>
    regions.map((region) => moveRegion(region, origin.x, origin.y));
  const idOf = (part: number) => solids[part]?.part.id ?? "";
  return {
    reference,
    parts: solids.flatMap(({ part }, i) => {
      const regions = move(arranged.parts[i] ?? []);
      return regions.length === 0 ? [] : [{ ...part, regions }];
    }),
    outline: move(arranged.outline),
    contacts: arranged.contacts.map(({ parts: [a, b], lines }) => ({
      parts: [idOf(a), idOf(b)],
      lines: lines.map((line) => moveLine(line, origin)),
    })),
    bodies: arranged.bodies.map((body) => body.map(idOf)),
    warnings: [...solids.flatMap(({ warnings }) => warnings), ...arranged.warnings],
  };
};

/**
 * The section that a drawing describes: parts placed, noded against each other, cut-outs taken away, overlaps of one
 * material counted once, contacts found. Parts that touch nothing keep their lines and arcs to the last bit.
 * @param drawing a checked document (`readDrawing`), mm.
 * @returns disjoint parts in drawing axes, or one fault for each thing wrong, with part and JSON pointer.
 */
export const sectionOf = (drawing: Drawing): Result<Section, readonly Fault[]> => {
  const wrong = checkDrawing(drawing);
  if (wrong.length > 0) return err(wrong);
  const origin = originOf(drawing.parts);
  const placed = placeAll(drawing, origin);
  if (!placed.ok) return placed;
  const { solids, cutouts } = placed.value;
  if (!solids.some(({ part }) => part.counts === "stiffness and mass"))
    return nothingStiff("drawing.empty", "Nothing in the drawing counts for stiffness yet. Add a part.");
  const reference = materialOf(drawing, drawing.reference, null);
  if (!reference.ok) return err([reference.error]);
  const arranged = arrange(
    solids.map(({ part, materialId }) => ({
      id: part.id,
      name: part.name,
      material: materialId,
      strength: part.material.fy,
      stiff: part.counts === "stiffness and mass",
      regions: part.regions,
    })),
    cutouts,
    origin,
  );
  if (!arranged.ok) return err(arranged.error.map((fault) => atPart(drawing, fault)));
  if (arranged.value.bodies.length === 0)
    return nothingStiff(
      "drawing.cutAway",
      "The cut-outs leave nothing that counts for stiffness. Make them smaller.",
    );
  const section = sectionFrom(solids, arranged.value, reference.value.material, origin);
  return ok({ ...section, warnings: [...section.warnings, ...jointWarnings(drawing, section.contacts)] });
};

const atPart = (drawing: Drawing, fault: Fault): Fault => {
  const index = drawing.parts.findIndex(({ id }) => id === fault.part);
  return index < 0 ? { ...fault, pointer: "/parts" } : { ...fault, pointer: `/parts/${index}` };
};
