import "server-only";
import { and, desc, eq, getTableColumns, isNull, sql } from "drizzle-orm";
import type { z } from "zod";
import { drawings } from "@/db/schema/drawings";
import { mayAtAll } from "@/lib/permissions";
import { PageQuery } from "@/lib/schemas/common";
import type { DrawingPage } from "@/lib/schemas/drawing";
import type { VerbArgs } from "../context";
import { decodeCursor, DEFAULT_PAGE, pageFrom } from "../cursor";
import { parseInput } from "../parse-input";
import { toItem } from "./load-drawing";

const { drawing: _drawing, ...inShort } = getTableColumns(drawings);

/** One's own drawings, the one last saved first. */
export const listDrawings = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof PageQuery>>): Promise<DrawingPage> => {
  mayAtAll(ctx.actor, "drawing.list");
  const { limit = DEFAULT_PAGE, cursor } = parseInput(PageQuery, input);
  const [updatedAt, id] = cursor === undefined ? [] : decodeCursor(cursor, 2);
  const rows = await ctx.db.read
    .select({ ...inShort, parts: sql<number>`json_array_length(${drawings.drawing}, '$.parts')` })
    .from(drawings)
    .where(
      and(
        eq(drawings.organisationId, ctx.actor.organisationId),
        eq(drawings.ownerId, ctx.actor.userId),
        isNull(drawings.deletedAt),
        updatedAt === undefined
          ? undefined
          : sql`(${drawings.updatedAt}, ${drawings.id}) < (${updatedAt}, ${id})`,
      ),
    )
    .orderBy(desc(drawings.updatedAt), desc(drawings.id))
    .limit(limit + 1);
  return pageFrom(rows, limit, toItem, (row) => [row.updatedAt, row.id]);
};
