import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { MAX_PARTS, MAX_VERTICES } from "@/lib/drawing/schema";
import type { Fault } from "@/lib/result";

const repeated = (things: readonly { id: string }[], key: string, name: string): readonly Fault[] => {
  const seen = new Set<string>();
  return things.flatMap(({ id }, i) => {
    if (!seen.has(id)) {
      seen.add(id);
      return [];
    }
    const code = `drawing.repeatedId`;
    return [
      { code, detail: `Two ${name} have the id "${id}". Give one another id.`, pointer: `/${key}/${i}/id` },
    ];
  });
};

const verticesOf = ({ shape }: DrawingPart): number =>
  shape.kind === "outline" ? shape.holes.reduce((n, hole) => n + hole.length, shape.outer.length) : 0;

const overLimits = (drawing: Drawing): readonly Fault[] => {
  const faults: Fault[] = [];
  if (drawing.parts.length > MAX_PARTS)
    faults.push({
      code: "drawing.tooManyParts",
      detail: `The drawing has ${drawing.parts.length} parts; ${MAX_PARTS} are allowed. Join plates, or split the drawing.`,
      pointer: "/parts",
    });
  const vertices = drawing.parts.reduce((n, part) => n + verticesOf(part), 0);
  if (vertices > MAX_VERTICES)
    faults.push({
      code: "drawing.tooManyVertices",
      detail: `The outlines have ${vertices} vertices together; ${MAX_VERTICES} are allowed. Simplify the outlines.`,
      pointer: "/parts",
    });
  return faults;
};

const unknownMaterials = (drawing: Drawing): readonly Fault[] => {
  const known = new Set(drawing.materials.map(({ id }) => id));
  const faults: Fault[] = drawing.parts.flatMap((part, i) =>
    part.cutout === true || known.has(part.material)
      ? []
      : [
          {
            code: "part.unknownMaterial",
            detail: `${part.name || part.id} names the material "${part.material}", which the drawing does not have. Choose one of its materials.`,
            part: part.id,
            pointer: `/parts/${i}/material`,
          },
        ],
  );
  if (!known.has(drawing.reference))
    faults.push({
      code: "drawing.unknownReference",
      detail: `The reference material "${drawing.reference}" is not among the materials. Choose one of them.`,
      pointer: "/reference",
    });
  return faults;
};

/**
 * What the schema cannot see: ids given twice, materials that are not there, limits over all parts together.
 * @returns one fault for each, empty where all is well.
 */
export const checkDrawing = (drawing: Drawing): readonly Fault[] => [
  ...repeated(drawing.parts, "parts", "parts"),
  ...repeated(drawing.materials, "materials", "materials"),
  ...unknownMaterials(drawing),
  ...overLimits(drawing),
];
