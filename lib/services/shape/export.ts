import "server-only";
import { inArray } from "drizzle-orm";
import type { z } from "zod";
import { shapes } from "@/db/schema/shapes";
import { NOT_CHECKED } from "@/lib/export/not-checked";
import { type ExportedShape, shapesCsvHead, shapesCsvRows } from "@/lib/export/shapes-csv";
import { mayAtAll } from "@/lib/permissions";
import { MAX_PAGE } from "@/lib/schemas/common";
import { type FinderRow, FindShapesQuery } from "@/lib/schemas/find-shapes";
import { listBays } from "../bay/list";
import type { Ctx, VerbArgs } from "../context";
import { parseInput } from "../parse-input";
import { findShapes } from "./find";

export type ExportFormat = "csv" | "json";

/**
 * All hits of a search as text, piece by piece: a page is read only when the reader has taken the one before, so an
 * export of 100,000 rows holds no more than a page in memory. Refusals come before the first piece.
 */
export const exportShapes = async ({
  ctx,
  input,
  format,
}: VerbArgs<z.input<typeof FindShapesQuery>, { format: ExportFormat }>): Promise<AsyncGenerator<string>> => {
  mayAtAll(ctx.actor, "shape.export");
  parseInput(FindShapesQuery, input);
  const query = { ...input, limit: String(MAX_PAGE), include: "drawing", cursor: undefined };
  const first = await findShapes({ ctx, input: query });
  const { items: bays } = await listBays({ ctx });
  const nameOf = new Map(bays.map((bay) => [bay.id, bay.name]));
  return format === "csv" ? csvPieces(ctx, query, first, nameOf) : jsonPieces(ctx, query, first, nameOf);
};

type Page = Awaited<ReturnType<typeof findShapes>>;
type Query = z.input<typeof FindShapesQuery>;
type BayNames = ReadonlyMap<string, string>;

async function* pagesOf(
  ctx: Ctx,
  query: Query,
  first: Page,
  bays: BayNames,
): AsyncGenerator<ExportedShape[]> {
  for (let page = first; ;) {
    const series = await seriesOf(ctx, page.items);
    yield page.items.map((row) => exported(row, bays.get(row.bayId) ?? "", series.get(row.id) ?? ""));
    if (page.next === null) return;
    page = await findShapes({ ctx, input: { ...query, cursor: page.next } });
  }
}

const seriesOf = async ({ db }: Ctx, rows: readonly FinderRow[]): Promise<ReadonlyMap<string, string>> => {
  if (rows.length === 0) return new Map();
  const found = await db.read
    .select({ id: shapes.id, series: shapes.series })
    .from(shapes)
    .where(
      inArray(
        shapes.id,
        rows.map((row) => row.id),
      ),
    );
  return new Map(found.map((row) => [row.id, row.series]));
};

const exported = (row: FinderRow, bay: string, series: string): ExportedShape => {
  const { mass, area, Ix, Sx, Zx, rx, Iy, Sy, Zy, ry, J, Cw } = row;
  return {
    designation: row.designation,
    family: row.family,
    series,
    bay,
    letter: row.letter,
    state: row.state,
    title: row.title,
    source: row.source,
    figures: { mass, area, Ix, Sx, Zx, rx, Iy, Sy, Zy, ry, J, Cw },
    unsymmetrical: row.unsymmetrical,
    drawing: row.drawing ?? null,
  };
};

async function* csvPieces(ctx: Ctx, query: Query, first: Page, bays: BayNames): AsyncGenerator<string> {
  yield `\ufeff${shapesCsvHead()}`;
  let begun = false;
  for await (const page of pagesOf(ctx, query, first, bays)) {
    yield shapesCsvRows(page, !begun);
    begun = true;
  }
}

async function* jsonPieces(ctx: Ctx, query: Query, first: Page, bays: BayNames): AsyncGenerator<string> {
  yield `{"caution":${JSON.stringify(NOT_CHECKED)},"units":"mm, mm², mm³, mm⁴, mm⁶, kg/m","items":[`;
  let begun = false;
  for await (const page of pagesOf(ctx, query, first, bays)) {
    for (const shape of page) {
      yield `${begun ? "," : ""}\n${JSON.stringify(shape)}`;
      begun = true;
    }
  }
  yield "\n]}\n";
}
