import { afterAll, beforeAll, expect, test } from "vitest";
import type { Reading } from "@/lib/intake/schema";
import { createReading } from "@/lib/services/reading/create";
import { deleteReading } from "@/lib/services/reading/delete";
import { listReadings } from "@/lib/services/reading/list";
import { updateReading } from "@/lib/services/reading/update";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());

const READING: Reading = {
  encoding: "utf-8",
  delimiter: ";",
  marks: { decimal: ",", thousands: null },
  headingLine: 1,
  unitLine: null,
  columns: [{ heading: "Nr", field: "designation", unit: null }],
  tolerance: 0.02,
  conventions: ["mass-by-nominal-wall"],
  family: null,
  material: "steel",
};
const logged = async (verb: string) =>
  Number(
    (await org.db.reader.execute({ sql: "SELECT count(*) FROM log WHERE verb = ?", args: [verb] }))
      .rows[0]?.[0],
  );

test("a reading is kept, changed and forgotten by name, each with its row in the log", async () => {
  const ctx = org.as("librarian");
  const kept = await createReading({ ctx, input: { name: "Northgate", reading: READING } });
  expect(kept).toMatchObject({ name: "Northgate", version: 1, reading: READING });
  await expect(createReading({ ctx, input: { name: "NORTHGATE", reading: READING } })).rejects.toMatchObject({
    code: "conflict",
    issues: [{ pointer: "/name" }],
  });
  const changed = await updateReading({
    ctx,
    readingId: kept.id,
    version: 1,
    input: { reading: { ...READING, tolerance: 0.01 } },
  });
  expect(changed).toMatchObject({ version: 2, reading: { tolerance: 0.01 } });
  await expect(
    updateReading({ ctx, readingId: kept.id, version: 1, input: { name: "x" } }),
  ).rejects.toMatchObject({ code: "stale" });
  expect((await listReadings({ ctx })).items).toHaveLength(1);
  await deleteReading({ ctx, readingId: kept.id, version: 2 });
  expect((await listReadings({ ctx })).items).toEqual([]);
  expect([
    await logged("reading.create"),
    await logged("reading.update"),
    await logged("reading.delete"),
  ]).toEqual([1, 1, 1]);
});

test("bad input is refused by field, a wrong role is forbidden, a stranger finds nothing", async () => {
  const ctx = org.as("librarian");
  const kept = await createReading({ ctx, input: { name: "Millbank", reading: READING } });
  await expect(
    createReading({ ctx, input: { name: "", reading: { ...READING, tolerance: 2 } } }),
  ).rejects.toMatchObject({ code: "invalid" });
  await expect(
    createReading({ ctx: org.as("engineer"), input: { name: "x", reading: READING } }),
  ).rejects.toMatchObject({ code: "forbidden" });
  await expect(
    updateReading({ ctx: org.stranger("librarian"), readingId: kept.id, version: 1, input: { name: "x" } }),
  ).rejects.toMatchObject({ code: "notFound" });
  await expect(
    deleteReading({ ctx: org.stranger("admin"), readingId: kept.id, version: 1 }),
  ).rejects.toMatchObject({ code: "notFound" });
  expect((await listReadings({ ctx: org.stranger("librarian") })).items).toEqual([]);
  expect((await listReadings({ ctx })).items).toMatchObject([{ name: "Millbank", version: 1 }]);
});
