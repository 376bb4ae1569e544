import { afterAll, beforeAll, expect, test } from "vitest";
import { rectangleDrawing, rectangleProperties } from "@/tests/helpers/rectangle-properties";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";
import { writeShapes, type ShapeToWrite } from "@/lib/services/shape/write-shapes";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());

const plate = (designation: string, depth: number): ShapeToWrite => ({
  existing: null,
  bayId: org.bayIds[0],
  counts: "computed",
  family: "custom",
  designation,
  title: "",
  series: "",
  drawing: rectangleDrawing(20, depth),
  note: "First issue",
  computed: rectangleProperties(20, depth),
  engineVersion: "test",
  tabulated: null,
  state: "released",
  deliveryId: null,
});

const count = async (sql: string, args: string[] = []) =>
  Number((await org.db.reader.execute({ sql, args })).rows[0]?.[0]);

test("600 shapes go in with their revisions, figures and finder rows, and none is lost between statements", async () => {
  const items = Array.from({ length: 600 }, (_, i) => plate(`PL ${i + 1}`, 100 + i));
  const written = await org.db.write((tx) => writeShapes(tx, org.as("librarian"), items));
  expect(new Set(written.map((w) => w.shapeId)).size).toBe(600);
  for (const table of ["shapes", "revisions", "figures", "finder"]) {
    expect(await count(`SELECT count(*) FROM ${table} WHERE organisation_id = ?`, [org.organisationId])).toBe(
      600,
    );
  }
  const last = await org.db.reader.execute({
    sql: "SELECT Sx, depth, state FROM finder WHERE shape_id = ?",
    args: [written[599]?.shapeId ?? ""],
  });
  expect(last.rows[0]?.Sx).toBe((20 * 699 ** 2) / 6);
  expect(last.rows[0]?.depth).toBe(699);
});

test("a further released revision supersedes the first and takes its place in the finder", async () => {
  const ctx = org.as("librarian");
  const [first] = await org.db.write((tx) => writeShapes(tx, ctx, [plate("RV 1", 200)]));
  if (!first) throw new Error("nothing written");
  const existing = { id: first.shapeId, lastOrdinal: 1, releasedOrdinal: 1, workingOrdinal: null, jobs: 3 };
  await org.db.write((tx) => writeShapes(tx, ctx, [{ ...plate("RV 1", 250), existing }]));
  const states = await org.db.reader.execute({
    sql: "SELECT ordinal, state FROM revisions WHERE shape_id = ? ORDER BY ordinal",
    args: [first.shapeId],
  });
  expect(states.rows.map((r) => [r.ordinal, r.state])).toEqual([
    [1, "superseded"],
    [2, "released"],
  ]);
  const rows = await org.db.reader.execute({
    sql: "SELECT ordinal, depth, jobs FROM finder WHERE shape_id = ?",
    args: [first.shapeId],
  });
  expect(rows.rows.map((r) => [r.ordinal, r.depth, r.jobs])).toEqual([[2, 250, 3]]);
});

test("a value that is not finite is refused and nothing of the transaction stays", async () => {
  const bad = plate("NF 1", 100);
  const write = org.db.write((tx) =>
    writeShapes(tx, org.as("librarian"), [
      plate("NF 0", 100),
      { ...bad, computed: { ...bad.computed, Cw: Number.POSITIVE_INFINITY } },
    ]),
  );
  await expect(write).rejects.toThrow(/not finite/);
  expect(await count("SELECT count(*) FROM shapes WHERE designation LIKE 'NF %'")).toBe(0);
});
