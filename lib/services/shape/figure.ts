import "server-only";
import type { Drawing } from "@/lib/drawing/schema";
import { AppError } from "@/lib/errors";
import { NOT_CHECKED } from "@/lib/export/not-checked";
import { mayAtAll } from "@/lib/permissions";
import { computePool } from "../compute/pool";
import type { Ctx } from "../context";
import { iso } from "../moments";
import { found } from "../not-found";
import { letterOf } from "./letter";
import { revisionOf, shapeOf } from "./load-shape";

const SIZE = { widthPx: 720, heightPx: 560 } as const;
/** Longest line of a caption at 11 px on the figure's width. */
const LINE_CHARACTERS = 110;

const linesOf = (text: string): string[] => {
  const lines: string[] = [];
  for (const word of text.split(" ")) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + word.length < LINE_CHARACTERS)
      lines[lines.length - 1] = `${last} ${word}`;
    else lines.push(word);
  }
  return lines;
};

/** The figure of a revision as an SVG document: the one asked for, else the released one, else the one in work. */
export const drawFigure = async ({
  ctx,
  shapeId,
  ordinal,
}: {
  ctx: Ctx;
  shapeId: string;
  ordinal: number | undefined;
}): Promise<string> => {
  mayAtAll(ctx.actor, "shape.figure");
  const shape = await shapeOf(ctx.db.read, ctx.actor, shapeId);
  const shown = found(ordinal ?? shape.releasedOrdinal ?? shape.workingOrdinal ?? undefined);
  const revision = await revisionOf(ctx.db.read, ctx.actor, shape, shown);
  const title = `${shape.designation}, revision ${letterOf(shown)}`;
  const stamp = `${title}, ${revision.state}, content ${revision.contentHash.slice(0, 16)}, printed ${iso(ctx.now).slice(0, 10)}. Dimensions in mm.`;
  const result = await computePool().run({
    kind: "figure",
    drawing: JSON.parse(revision.drawing) as Drawing,
    ...SIZE,
    title,
    captions: [...linesOf(stamp), ...linesOf(NOT_CHECKED)],
  });
  if (result.ok) return result.value;
  throw new AppError("internal", { user: "The figure could not be drawn.", cause: result.error });
};
