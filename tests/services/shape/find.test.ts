import type { InArgs, InStatement, ResultSet } from "@libsql/client";
import { afterAll, beforeAll, expect, test } from "vitest";
import { findShapes } from "@/lib/services/shape/find";
import { writeShapes } from "@/lib/services/shape/write-shapes";
import { rectangleDrawing, rectangleProperties } from "@/tests/helpers/rectangle-properties";
import { makeDraft } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";
import { toStored } from "@/lib/units/conversion";

let org: TestOrganisation;
const DEPTHS = Array.from({ length: 40 }, (_, i) => 100 + 10 * i);

beforeAll(async () => {
  org = await testOrganisation();
  await org.db.write((tx) =>
    writeShapes(
      tx,
      org.as("librarian"),
      DEPTHS.map((depth, i) => ({
        existing: null,
        bayId: org.bayIds[i % 2 === 0 ? 0 : 1],
        counts: "computed",
        family: i % 4 === 0 ? "flat" : "custom",
        designation: `RB ${depth}×20`,
        title: "",
        series: "",
        drawing: rectangleDrawing(20, depth),
        note: "",
        computed: { ...rectangleProperties(20, depth), J: i % 3 === 0 ? depth : null },
        engineVersion: "test",
        tabulated: null,
        state: "released",
        deliveryId: null,
      })),
    ),
  );
});
afterAll(() => org.close());

const find = (input: Parameters<typeof findShapes>[0]["input"], role: "designer" | "engineer" = "designer") =>
  findShapes({ ctx: org.as(role), input });

test("least S and least I, lightest first, and nothing below either", async () => {
  const minSx = (20 * 250 ** 2) / 6;
  const minIx = (20 * 300 ** 3) / 12;
  const { items } = await find({ minSx: String(minSx), minIx: String(minIx), maxDepth: "400" });
  expect(items.map((row) => row.depth)).toEqual(DEPTHS.filter((d) => d >= 300 && d <= 400));
});

test("inches are converted before they are compared", async () => {
  const { items } = await find({ minDepth: "10", maxDepth: "12", unit: "in" });
  const [from, to] = [toStored(10, "in"), toStored(12, "in")];
  expect(items.map((row) => row.depth)).toEqual(DEPTHS.filter((d) => d >= from && d <= to));
});

test.each(["mass", "-mass", "designation", "J", "-J", "SxPerMass", "family", "-depth"])(
  "pages of 7 in order of %s hold every shape once, in the order of one big page",
  async (sort) => {
    const whole = (await find({ sort, limit: "200" })).items.map((row) => row.id);
    const paged: string[] = [];
    let cursor: string | undefined;
    do {
      const page = await find({ sort, limit: "7", ...(cursor && { cursor }) });
      paged.push(...page.items.map((row) => row.id));
      cursor = page.next ?? undefined;
    } while (cursor);
    expect(paged).toEqual(whole);
    expect(new Set(paged).size).toBe(DEPTHS.length);
  },
);

test("a shape without J stands at the end whichever way the list runs", async () => {
  for (const sort of ["J", "-J"]) {
    const { items } = await find({ sort, limit: "200" });
    const firstWithout = items.findIndex((row) => row.J === null);
    expect(items.slice(firstWithout).every((row) => row.J === null)).toBe(true);
  }
});

test("counts by bay ignore the bay asked for, counts by family the family, and tell how many there are at all", async () => {
  const { counts, items } = await find({
    include: "counts",
    bay: org.bayIds[0],
    family: "flat",
    limit: "200",
  });
  expect(counts).toMatchObject({ total: items.length, of: DEPTHS.length });
  expect(counts?.byFamily).toEqual({ flat: 10, custom: 10 });
  expect(counts?.byBay).toEqual({ [org.bayIds[0]]: 10 });
});

test("text forgives spacing, case and ×, and takes % as it is", async () => {
  expect((await find({ q: "rb300x20" })).items.map((row) => row.designation)).toEqual(["RB 300×20"]);
  expect((await find({ q: "%" })).items).toEqual([]);
});

test("drafts answer only when asked for, and only to those who may draft in the bay", async () => {
  const draft = await makeDraft(org, org.as("engineer"), { depth: 77 });
  expect((await find({ maxDepth: "80" }, "engineer")).items).toEqual([]);
  expect((await find({ state: "draft" }, "designer")).items).toEqual([]);
  expect(
    (await find({ state: "draft,released", maxDepth: "80" }, "engineer")).items.map((r) => r.id),
  ).toEqual([draft.id]);
  const elsewhere = org.as("engineer", { [org.bayIds[0]]: "read" });
  expect((await findShapes({ ctx: elsewhere, input: { state: "draft" } })).items).toEqual([]);
  const raised = org.as("designer", { [org.bayIds[0]]: "draft" });
  expect((await findShapes({ ctx: raised, input: { state: "draft" } })).items.map((r) => r.id)).toEqual([
    draft.id,
  ]);
});

test("another organisation finds nothing of it, not even by a bay's id", async () => {
  const stranger = org.stranger("admin");
  expect((await findShapes({ ctx: stranger, input: {} })).items).toEqual([]);
  expect((await findShapes({ ctx: stranger, input: { bay: org.bayIds[0] } })).items).toEqual([]);
});

test.each([
  [{ minSx: "" }, "/minSx"],
  [{ minSx: "NaN" }, "/minSx"],
  [{ minSx: "1e309" }, "/minSx"],
  [{ minSx: "12 cm" }, "/minSx"],
  [{ limit: "0" }, "/limit"],
  [{ limit: "201" }, "/limit"],
  [{ sort: "password" }, "/sort"],
  [{ state: "superseded" }, "/state/0"],
  [{ cursor: "%%%" }, "/cursor"],
  [{ colour: "red" }, "/colour"],
])("%o is refused and the field is named", async (query, pointer) => {
  await expect(find(query as Parameters<typeof find>[0])).rejects.toMatchObject({
    code: "invalid",
    issues: expect.arrayContaining([expect.objectContaining({ pointer })]),
  });
});

test("a cursor of another order is refused instead of skipping rows", async () => {
  const { next } = await find({ limit: "5" });
  await expect(find({ sort: "depth", cursor: next ?? "" })).rejects.toMatchObject({ code: "invalid" });
});

/** What SQLite plans for each statement that the search really sends. */
const plansOf = async (input: Parameters<typeof find>[0]): Promise<string[]> => {
  const sent: { sql: string; args: InArgs }[] = [];
  const { execute } = org.db.reader;
  const execution: (statement: InStatement) => Promise<ResultSet> = execute.bind(org.db.reader);
  org.db.reader.execute = (statement: InStatement) => {
    if (typeof statement !== "string") sent.push({ sql: statement.sql, args: statement.args ?? [] });
    return execution(statement);
  };
  try {
    await find(input);
  } finally {
    org.db.reader.execute = execute;
  }
  const plans: string[] = [];
  for (const { sql, args } of sent) {
    const { rows } = await execution({ sql: `EXPLAIN QUERY PLAN ${sql}`, args });
    plans.push(rows.map((row) => String(row.detail)).join("\n"));
  }
  return plans;
};

test("the search by least S and I walks its index in order of mass and sorts nothing, on the first page and the next", async () => {
  const { next } = await find({ minSx: "1", minIx: "1", limit: "5" });
  for (const cursor of [{}, { cursor: next ?? "" }]) {
    const [plan] = await plansOf({ minSx: "1", minIx: "1", maxDepth: "10000", limit: "5", ...cursor });
    expect(plan).toContain("finder_walk");
    expect(plan).not.toContain("TEMP B-TREE FOR ORDER BY");
  }
});

test("counting by bay and family reads an index and no row", async () => {
  const [, hits, all] = await plansOf({ minSx: "1", include: "counts" });
  expect(hits).toContain("COVERING INDEX finder_facets");
  expect(all).toContain("COVERING INDEX");
});
