import "server-only";
import { and, count, eq, inArray } from "drizzle-orm";
import type { z } from "zod";
import { finder } from "@/db/schema/finder";
import { revisions } from "@/db/schema/revisions";
import type { Drawing } from "@/lib/drawing/schema";
import { mayAtAll } from "@/lib/permissions";
import {
  type FinderCounts,
  type FinderPage,
  type FinderRow,
  FindShapesQuery,
} from "@/lib/schemas/find-shapes";
import { SHAPE_FAMILIES, ShapeFamily } from "@/lib/schemas/shape";
import type { Ctx, VerbArgs } from "../context";
import { DEFAULT_PAGE, pageFrom } from "../cursor";
import { parseInput } from "../parse-input";
import { conditionsOf } from "./find-filter";
import { findOrder } from "./find-order";
import { letterOf } from "./letter";
import { visibleRows } from "./visible";

export const finderColumns = {
  id: finder.shapeId,
  revisionId: finder.id,
  ordinal: finder.ordinal,
  state: finder.state,
  bayId: finder.bayId,
  family: finder.family,
  designation: finder.designation,
  title: finder.title,
  source: finder.source,
  mass: finder.mass,
  depth: finder.depth,
  width: finder.width,
  area: finder.area,
  Ix: finder.Ix,
  Iy: finder.Iy,
  I2: finder.I2,
  Sx: finder.Sx,
  Sy: finder.Sy,
  Zx: finder.Zx,
  Zy: finder.Zy,
  rx: finder.rx,
  ry: finder.ry,
  r2: finder.r2,
  J: finder.J,
  Cw: finder.Cw,
  jobs: finder.jobs,
};

const freeColumns = {
  unsymmetrical: finder.unsymmetrical,
  factorX: finder.factorX,
  factorY: finder.factorY,
  SxFree: finder.SxFree,
  SyFree: finder.SyFree,
};

type Free = Readonly<{
  unsymmetrical: boolean;
  factorX: number | null;
  factorY: number | null;
  SxFree: number | null;
  SyFree: number | null;
}>;

export const unsymmetricalOf = ({
  unsymmetrical,
  factorX,
  factorY,
  SxFree,
  SyFree,
}: Free): FinderRow["unsymmetrical"] =>
  unsymmetrical && factorX !== null && factorY !== null && SxFree !== null && SyFree !== null
    ? { factorX, factorY, SxFree, SyFree }
    : null;

/** Searches the Rack on the finder's rows: released only unless other states are asked for and may be seen. */
export const findShapes = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof FindShapesQuery>>): Promise<FinderPage> => {
  mayAtAll(ctx.actor, "shape.find");
  const query = parseInput(FindShapesQuery, input);
  const limit = query.limit ?? DEFAULT_PAGE;
  const sort = query.sort ?? "mass";
  const order = findOrder(sort, query.cursor);
  const visible = visibleRows(ctx.actor, query.state ?? ["released"]);
  const rows = await ctx.db.read
    .select({ row: finderColumns, free: freeColumns, place: order.by })
    .from(finder)
    .where(and(visible, conditionsOf(query), order.after))
    .orderBy(...order.orderBy)
    .limit(limit + 1);
  const page = pageFrom(
    rows,
    limit,
    ({ row, free }): FinderRow => ({
      ...row,
      family: ShapeFamily.parse(row.family),
      letter: letterOf(row.ordinal),
      unsymmetrical: unsymmetricalOf(free),
    }),
    ({ row, place }) => [sort, place, row.revisionId],
  );
  return {
    items: query.include?.includes("drawing") ? await withDrawings(ctx, page.items) : page.items,
    next: page.next,
    ...(query.include?.includes("counts") && { counts: await countShapes(ctx, query) }),
  };
};

const withDrawings = async ({ db, actor }: Ctx, rows: readonly FinderRow[]): Promise<FinderRow[]> => {
  const ids = rows.map((row) => row.revisionId);
  if (ids.length === 0) return [];
  const drawn = await db.read
    .select({ id: revisions.id, drawing: revisions.drawing })
    .from(revisions)
    .where(and(eq(revisions.organisationId, actor.organisationId), inArray(revisions.id, ids)));
  const drawingOf = new Map(drawn.map((row) => [row.id, row.drawing]));
  return rows.map((row) => {
    const text = drawingOf.get(row.revisionId);
    return text === undefined ? row : { ...row, drawing: JSON.parse(text) as Drawing };
  });
};

const addTo = (counts: Record<string, number>, name: string, by: number) => {
  counts[name] = (counts[name] ?? 0) + by;
};

/** Hits by bay (whatever bay is asked for) and by family (whatever family), and how many shapes there are without ranges. */
const countShapes = async ({ db, actor }: Ctx, query: FindShapesQuery): Promise<FinderCounts> => {
  const visible = visibleRows(actor, query.state ?? ["released"]);
  // Naming all families lets the count walk finder_facets by family and least S.
  const anyFamily = inArray(finder.family, [...SHAPE_FAMILIES]);
  const hits = await db.read
    .select({ bayId: finder.bayId, family: finder.family, shapes: count() })
    .from(finder)
    .where(and(visible, anyFamily, conditionsOf(query, { facets: true })))
    .groupBy(finder.family, finder.bayId);
  const all = await db.read
    .select({ bayId: finder.bayId, shapes: count() })
    .from(finder)
    .where(visible)
    .groupBy(finder.bayId);
  const counts: FinderCounts = { total: 0, byBay: {}, byFamily: {}, of: 0, ofByBay: {} };
  for (const { bayId, family, shapes } of hits) {
    const bayFits = query.bay?.includes(bayId) ?? true;
    const familyFits = query.family?.some((asked) => asked === family) ?? true;
    if (bayFits && familyFits) counts.total += shapes;
    if (familyFits) addTo(counts.byBay, bayId, shapes);
    if (bayFits) addTo(counts.byFamily, family, shapes);
  }
  for (const { bayId, shapes } of all) {
    counts.of += shapes;
    addTo(counts.ofByBay, bayId, shapes);
  }
  return counts;
};
