import { afterAll, beforeAll, expect, test } from "vitest";
import { createShape } from "@/lib/services/shape/create";
import { updateShape } from "@/lib/services/shape/update";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";
import { makeDraft, makeReleased, nextDesignation } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";
import { expectRel } from "@/tests/helpers/expect-rel";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());

const input = () => ({
  bayId: org.bayIds[0],
  family: "custom" as const,
  designation: nextDesignation(),
  drawing: rectangleDrawing(20, 300),
});

test("an engineer's drawing becomes a draft with figures computed by the server, and the deed is logged", async () => {
  const ctx = org.as("engineer");
  const sheet = await createShape({ ctx, input: { ...input(), title: "Web plate", note: "First issue" } });
  expect(sheet).toMatchObject({ title: "Web plate", workingOrdinal: 1, releasedOrdinal: null, version: 1 });
  expect(sheet.revision).toMatchObject({ letter: "A", state: "draft", note: "First issue" });
  expectRel(sheet.revision.computed.Ix, (20 * 300 ** 3) / 12, { rel: 1e-12 });
  expectRel(sheet.revision.computed.Sx, (20 * 300 ** 2) / 6, { rel: 1e-12 });
  await expectLogged(org.db, "shape.create", sheet.id, ctx.actor.userId);
});

test("a designer may not draft, and where an admin raised them in one bay they may there only", async () => {
  await expectRefused(org.db, "forbidden", () => createShape({ ctx: org.as("designer"), input: input() }));
  const raised = org.as("designer", { [org.bayIds[0]]: "draft" });
  await expect(createShape({ ctx: raised, input: input() })).resolves.toBeDefined();
  await expectRefused(org.db, "forbidden", () =>
    createShape({ ctx: raised, input: { ...input(), bayId: org.bayIds[1] } }),
  );
});

test("a bay of another organisation is not found", async () => {
  await expectRefused(org.db, "notFound", () =>
    createShape({ ctx: org.stranger("engineer"), input: input() }),
  );
});

test.each([
  ["an unknown field", { organisationId: "x" }, "/organisationId"],
  ["a designation that a spreadsheet would run", { designation: "=A1" }, "/designation"],
  ["a family that does not exist", { family: "girderish" }, "/family"],
  [
    "a size of 1e309",
    { drawing: rectangleDrawing(20, Number.POSITIVE_INFINITY) },
    "/drawing/parts/0/shape/height",
  ],
])("%s is refused by name and nothing is written", async (_what, wrong, pointer) => {
  await expectRefused(org.db, "invalid", () =>
    createShape({ ctx: org.as("engineer"), input: { ...input(), ...(wrong as object) } }),
  );
  await expect(
    createShape({ ctx: org.as("engineer"), input: { ...input(), ...(wrong as object) } }),
  ).rejects.toMatchObject({ issues: expect.arrayContaining([expect.objectContaining({ pointer })]) });
});

test("a drawing that cannot be computed names the part", async () => {
  const drawing = rectangleDrawing(20, 300);
  const part = drawing.parts[0];
  if (!part) throw new Error("no part");
  const nowhere = { ...drawing, parts: [{ ...part, material: "gold" }] } as typeof drawing;
  await expect(
    createShape({ ctx: org.as("engineer"), input: { ...input(), drawing: nowhere } }),
  ).rejects.toMatchObject({ code: "invalid", issues: [expect.objectContaining({ part: "p1" })] });
});

test("a designation that is there already, in other case or with x for ×, is a conflict", async () => {
  await makeDraft(org, org.as("engineer"), { designation: "TK 5×10" });
  await expectRefused(org.db, "conflict", () =>
    makeDraft(org, org.as("engineer"), { designation: "tk 5X10" }),
  );
});

test("of sixteen at once with one designation exactly one wins", async () => {
  const results = await Promise.allSettled(
    Array.from({ length: 16 }, () => makeDraft(org, org.as("engineer"), { designation: "SIXTEEN 1" })),
  );
  expect(results.filter((r) => r.status === "fulfilled")).toHaveLength(1);
  for (const r of results) if (r.status === "rejected") expect(r.reason).toMatchObject({ code: "conflict" });
});

test("renaming a draft is its drafter's, renaming what is released needs the right to release", async () => {
  const ctx = org.as("engineer");
  const draft = await makeDraft(org, ctx);
  const renamed = await updateShape({ ctx, shapeId: draft.id, version: 1, input: { title: "New title" } });
  expect(renamed).toMatchObject({ title: "New title", version: 2 });
  await expectLogged(org.db, "shape.update", draft.id, ctx.actor.userId);
  await expectRefused(org.db, "stale", () =>
    updateShape({ ctx, shapeId: draft.id, version: 1, input: { title: "Later" } }),
  );
  const released = await makeReleased(org);
  await expectRefused(org.db, "forbidden", () =>
    updateShape({ ctx, shapeId: released.id, version: 4, input: { title: "x" } }),
  );
  await expectRefused(org.db, "notFound", () =>
    updateShape({ ctx: org.stranger("admin"), shapeId: released.id, version: 4, input: { title: "x" } }),
  );
  const moved = await updateShape({
    ctx: org.as("librarian"),
    shapeId: released.id,
    version: 4,
    input: { bayId: org.bayIds[1] },
  });
  expect(moved.bay.id).toBe(org.bayIds[1]);
});
