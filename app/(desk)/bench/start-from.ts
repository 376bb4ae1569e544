import { shapeLinkOf } from "@/components/bench/shape-link";
import type { BenchStart } from "@/components/bench/bench-store";
import { AppError } from "@/lib/errors";
import { etagOf } from "@/lib/http/version";
import type { DrawingRecord } from "@/lib/schemas/drawing";
import type { Ctx } from "@/lib/services/context";
import { showShape } from "@/lib/services/shape/show";

/** A sheet begun from a revision of a shape: its drawing, to be changed into the next revision. */
export const startFromShape = async (
  ctx: Ctx,
  shapeId: string,
  ordinal: number | undefined,
): Promise<BenchStart> => {
  const sheet = await showShape({ ctx, shapeId, ordinal });
  return {
    name: sheet.title || sheet.designation,
    drawing: sheet.revision.drawing,
    of: { shapeId: sheet.id, ordinal: sheet.revision.ordinal },
    shape: shapeLinkOf(sheet),
  };
};

/** A sheet of one's own begun from a revision: its parts remember where they came from, the sheet is linked to nothing. */
export const startFromCopy = async (
  ctx: Ctx,
  shapeId: string,
  ordinal: number | undefined,
): Promise<BenchStart> => {
  const sheet = await showShape({ ctx, shapeId, ordinal });
  const { drawing } = sheet.revision;
  const from = { shape: sheet.id, revision: sheet.revision.ordinal };
  return {
    name: `After ${sheet.designation}`,
    drawing: { ...drawing, parts: drawing.parts.map((p) => (p.cutout === true ? p : { ...p, from })) },
  };
};

/** A saved drawing, with the shape it belongs to while that can still be seen. */
export const startFromDrawing = async (ctx: Ctx, record: DrawingRecord): Promise<BenchStart> => {
  const saved = {
    name: record.name,
    drawing: record.drawing,
    savedAs: { id: record.id, etag: etagOf(record.version), at: record.updatedAt },
    of: record.of,
  };
  if (!record.of) return saved;
  try {
    const sheet = await showShape({ ctx, shapeId: record.of.shapeId, ordinal: record.of.ordinal });
    return { ...saved, shape: shapeLinkOf(sheet) };
  } catch (error) {
    if (error instanceof AppError && error.code === "notFound") return saved;
    throw error;
  }
};
