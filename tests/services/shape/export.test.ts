import Papa from "papaparse";
import { afterAll, beforeAll, expect, test } from "vitest";
import { stockDrawing } from "@/lib/intake/stock-drawing";
import { updateShape } from "@/lib/services/shape/update";
import { compareRevisions } from "@/lib/services/revision/compare";
import { createRevision } from "@/lib/services/revision/create";
import { drawFigure } from "@/lib/services/shape/figure";
import { exportShapes } from "@/lib/services/shape/export";
import { findShapes } from "@/lib/services/shape/find";
import { showShape } from "@/lib/services/shape/show";
import { writeShapes } from "@/lib/services/shape/write-shapes";
import { expectRel } from "@/tests/helpers/expect-rel";
import { rectangleDrawing, rectangleProperties } from "@/tests/helpers/rectangle-properties";
import { expectRefused } from "@/tests/helpers/refuses";
import { makeReleased } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";
import { takeIn } from "@/tests/unit/intake/intake-of";

let org: TestOrganisation;
const COUNT = 450;
const profileOf = (i: number) =>
  ({
    family: "flat",
    dimensions: { width: 20 + i / 7, thickness: 10.1 },
  }) as const;

beforeAll(async () => {
  org = await testOrganisation();
  await org.db.write((tx) =>
    writeShapes(
      tx,
      org.as("librarian"),
      Array.from({ length: COUNT }, (_, i) => ({
        existing: null,
        bayId: org.bayIds[1],
        counts: "computed",
        family: "flat",
        designation: `FL ${i}`,
        title: i === 3 ? '=HYPERLINK("x"), "quoted"\nand broken' : "",
        series: i % 2 === 0 ? "FLAT" : "House series",
        drawing: stockDrawing(profileOf(i), `FL ${i}`, "steel"),
        note: "",
        computed: rectangleProperties(20 + i / 7, 10.1),
        engineVersion: "t",
        tabulated: null,
        state: "released",
        deliveryId: null,
      })),
    ),
  );
});
afterAll(() => org.close());

const textOf = async (format: "csv" | "json", input: Parameters<typeof findShapes>[0]["input"] = {}) => {
  let text = "";
  for await (const piece of await exportShapes({ ctx: org.as("designer"), input, format })) text += piece;
  return text;
};

test("the CSV holds every hit once, numbers bare in full precision, and no cell that a spreadsheet would run", async () => {
  const text = await textOf("csv");
  const { data, errors } = Papa.parse<Record<string, string>>(text.replace(/^\ufeff/, ""), {
    header: true,
    skipEmptyLines: true,
  });
  expect(errors).toEqual([]);
  expect(data).toHaveLength(COUNT);
  const row = data.find((r) => r.Designation === "FL 3");
  expect(Number(row?.["Ix [mm4]"])).toBe(rectangleProperties(20 + 3 / 7, 10.1).Ix);
  expect(row?.Title?.startsWith("'=")).toBe(true);
  expect(data.filter((r) => r.Caution !== "")).toHaveLength(1);
  for (const cells of data) {
    for (const cell of Object.values(cells)) expect(cell).not.toMatch(/^[=+@\t\r]|^-(?!\d)/);
  }
});

test("Goods-in takes the export back unchanged: every row read, dimension for dimension", async () => {
  const taken = takeIn(new TextEncoder().encode(await textOf("csv")));
  expect(taken.fault).toBeNull();
  expect(taken.rows).toHaveLength(COUNT);
  const byName = new Map(taken.rows.map((r) => [r.inspection.designation, r.inspection]));
  for (let i = 0; i < COUNT; i += 1) {
    const inspection = byName.get(`FL ${i}`);
    expect(inspection?.verdict).toBe("accepted");
    expect(inspection?.profile).toEqual(profileOf(i));
  }
});

test("the JSON holds the same shapes with their drawings, and says what was not checked", async () => {
  const all = JSON.parse(await textOf("json", { minDepth: "10" })) as {
    caution: string;
    items: { designation: string }[];
  };
  expect(all.caution).toContain("licensed engineer");
  expect(all.items).toHaveLength(COUNT);
  const none = JSON.parse(await textOf("json", { minMass: "100000" })) as { items: unknown[] };
  expect(none.items).toEqual([]);
});

test("an export asks what a search asks: a wrong query is refused, strangers get nothing", async () => {
  await expectRefused(org.db, "invalid", () =>
    exportShapes({ ctx: org.as("designer"), input: { minSx: "x" }, format: "csv" }),
  );
  let text = "";
  for await (const piece of await exportShapes({ ctx: org.stranger("admin"), input: {}, format: "csv" }))
    text += piece;
  expect(text.trim().split("\r\n")).toHaveLength(1);
});

test("the figure is an SVG of the revision with its cautions, and not found for strangers", async () => {
  const { id } = await makeReleased(org);
  const svg = await drawFigure({ ctx: org.as("designer"), shapeId: id, ordinal: undefined });
  expect(svg).toMatch(/^<svg xmlns="http:\/\/www\.w3\.org\/2000\/svg"/);
  expect(svg).toContain("revision A");
  expect(svg).toContain("licensed engineer");
  expect(svg).not.toMatch(/NaN|undefined|<script/);
  await expectRefused(org.db, "notFound", () =>
    drawFigure({ ctx: org.stranger("admin"), shapeId: id, ordinal: undefined }),
  );
});

test("two revisions compared give every property and its change relative to the first", async () => {
  const { id } = await makeReleased(org, { depth: 200 });
  const ctx = org.as("engineer");
  const sheet = await showShape({ ctx, shapeId: id });
  await createRevision({
    ctx,
    shapeId: id,
    version: sheet.version,
    input: { drawing: rectangleDrawing(20, 220) },
  });
  const { changes } = await compareRevisions({ ctx, shapeId: id, from: 1, to: 2 });
  const change = changes.find((c) => c.property === "Ix");
  expectRel(change?.relative ?? null, 1.1 ** 3 - 1, { rel: 1e-9 });
  expect(changes.find((c) => c.property === "centroid.x")?.relative).toBeNull();
  await expectRefused(org.db, "notFound", () =>
    compareRevisions({ ctx: org.as("designer"), shapeId: id, from: 1, to: 2 }),
  );
});

test("a title that is changed is exported as it is now", async () => {
  const { items } = await findShapes({ ctx: org.as("librarian"), input: { q: "FL 7", limit: "1" } });
  const sheet = await showShape({ ctx: org.as("librarian"), shapeId: items[0]?.id ?? "" });
  await updateShape({
    ctx: org.as("librarian"),
    shapeId: sheet.id,
    version: sheet.version,
    input: { title: "+1 spare" },
  });
  expect(await textOf("csv", { q: "spare" })).toContain("'+1 spare");
});
