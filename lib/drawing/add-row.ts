import { freeId } from "@/lib/drawing/edit-parts";
import { boxOfParts, middleOf } from "@/lib/drawing/placed-part";
import type { Drawing, DrawingPart, PartShape } from "@/lib/drawing/schema";
import { MIN_SIZE_MM } from "@/lib/geometry/limits";
import { err, ok, type Result } from "@/lib/result";
import { parseLength, type LengthOptions } from "@/lib/units/parse-length";

const TIMES = /\s*[x×]\s*/i;
const TRAILING_UNIT = /(?:mm|cm|m|in|ft|"|')\s*$/i;
const ROUND = /^(?:Ø|dia\.?|d|round|tube)\s*(?=[\d.,])/i;

/** A typed length kept to a picometre, so that 12 in is 304.8 mm and not its neighbour in binary. */
export const typedMm = (mm: number): number => Math.round(mm * 1e9) / 1e9;

const sizes = (text: string, options: LengthOptions): Result<number[]> => {
  const pieces = text.split(TIMES);
  const unit = TRAILING_UNIT.exec(pieces.at(-1) ?? "")?.[0].trim();
  const found: number[] = [];
  for (const piece of pieces) {
    const shared = unit && !/[a-z"']/i.test(piece) ? `${piece} ${unit}` : piece;
    const length = parseLength(shared, options);
    if (!length.ok) return length;
    if (length.value.mm < MIN_SIZE_MM)
      return err({ code: "row.noSize", detail: `"${piece.trim()}" is no size: type one above 0.` });
    found.push(typedMm(length.value.mm));
  }
  return ok(found);
};

/**
 * What a typed row means: "420x36" a plate of width by height, "Ø219.1x8" a tube, "Ø60" a solid round. Sums, fractions and
 * units work in each size; a unit at the end counts for all. Anything else is not a row of sizes (perhaps a designation).
 */
export const parseRow = (text: string, options: LengthOptions): Result<PartShape> => {
  const trimmed = text.trim();
  const round = ROUND.test(trimmed);
  const found = sizes(trimmed.replace(ROUND, ""), options);
  if (!found.ok) return found;
  const [first, second, ...more] = found.value;
  if (first === undefined || more.length > 0 || (!round && second === undefined))
    return err({
      code: "row.unreadable",
      detail: `"${trimmed}" is not a row: type width x height such as 420x36, or Ø219.1x8 for a tube.`,
    });
  if (!round) return ok({ kind: "plate", width: first, height: second ?? first });
  if (second === undefined) return ok({ kind: "round", diameter: first });
  if (2 * second >= first)
    return err({
      code: "row.noBore",
      detail: `A wall of ${second} mm leaves no bore in a diameter of ${first} mm.`,
    });
  return ok({ kind: "round", diameter: first, wall: second });
};

const sizeOf = (shape: PartShape): { height: number } =>
  shape.kind === "plate" ? { height: shape.height } : { height: shape.kind === "round" ? shape.diameter : 0 };

const NAME: Record<PartShape["kind"], string> = {
  plate: "Plate",
  round: "Round",
  outline: "Outline",
  profile: "Profile",
};

/**
 * A new part for a shape: it stands on top of the part given (or of everything drawn), centred on it, so that a girder can be
 * typed from the bottom flange up; the first part stands on the datum.
 */
export const partFor = (drawing: Drawing, shape: PartShape, on?: string): DrawingPart => {
  const under = on === undefined ? boxOfParts(drawing) : boxOfParts(drawing, [on]);
  const material =
    drawing.parts.flatMap((p) => (p.cutout === true ? [] : [p.material])).at(-1) ?? drawing.reference;
  const { height } = sizeOf(shape);
  const name = shape.kind === "round" && shape.wall !== undefined ? "Tube" : NAME[shape.kind];
  return {
    id: freeId(drawing),
    name,
    material,
    at: under ? { x: middleOf(under).x, y: under.yMax + height / 2 } : { x: 0, y: height / 2 },
    angle: 0,
    shape,
  };
};
