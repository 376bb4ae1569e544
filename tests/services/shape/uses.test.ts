import { afterAll, beforeAll, expect, test } from "vitest";
import type { Drawing } from "@/lib/drawing/schema";
import { createComment } from "@/lib/services/comment/create";
import { createDrawing } from "@/lib/services/drawing/create";
import { listShapeUses } from "@/lib/services/shape/uses";
import { discardRevision } from "@/lib/services/revision/discard";
import { withdrawRevision } from "@/lib/services/revision/withdraw";
import { newId } from "@/lib/services/new-id";
import { newestLetter } from "@/tests/helpers/letters";
import { expectRefused } from "@/tests/helpers/refuses";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";
import { makeDraft, makeReleased } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());

const builtFrom = (shape: string): Drawing => {
  const drawing = rectangleDrawing(20, 300);
  return {
    ...drawing,
    parts: drawing.parts.map((part) => ({ ...part, from: { shape, revision: 1 } })),
  } as Drawing;
};

test("authors of what is built on a shape hear of its withdrawal, each of their own things only", async () => {
  const { id, revision } = await makeReleased(org);
  const input = (name: string) => ({ name, drawing: builtFrom(id) });
  await createDrawing({ ctx: org.as("designer"), input: input("Designer's own") });
  await createDrawing({ ctx: org.as("engineer"), input: input("Engineer's own") });
  const shape = await makeDraft(org, org.as("engineer"), { drawing: builtFrom(id) });
  const seen = async (role: "designer" | "engineer") =>
    (await listShapeUses({ ctx: org.as(role), shapeId: id })).items.map((item) => item.name);
  expect(await seen("designer")).toEqual(["Designer's own"]);
  expect(await seen("engineer")).toEqual(["Engineer's own", `${shape.designation} A`]);
  await withdrawRevision({
    ctx: org.as("librarian"),
    shapeId: id,
    ordinal: 1,
    version: revision.version,
    input: { reason: "Rolled no longer" },
  });
  const email = async (role: "designer" | "engineer") =>
    String(
      (
        await org.db.reader.execute({
          sql: "SELECT email FROM users WHERE id = ?",
          args: [org.actors[role].userId],
        })
      ).rows[0]?.email,
    );
  const letter = await newestLetter(org.db, await email("designer"));
  expect(letter.subject).toContain("is withdrawn");
  expect(letter.text).toContain("Designer's own");
  expect(letter.text).not.toContain("Engineer's own");
  expect((await newestLetter(org.db, await email("engineer"))).text).toContain(`${shape.designation} A`);
});

test("a drawing that names shapes there are not, or another organisation's, is kept and notes nothing", async () => {
  const { id } = await makeReleased(org);
  const stranger = org.stranger("engineer");
  await createDrawing({ ctx: stranger, input: { name: "Foreign", drawing: builtFrom(id) } });
  await expect(makeDraft(org, org.as("engineer"), { drawing: builtFrom(newId()) })).resolves.toBeDefined();
  expect((await listShapeUses({ ctx: org.as("engineer"), shapeId: id })).items).toEqual([]);
  await expectRefused(org.db, "notFound", () => listShapeUses({ ctx: stranger, shapeId: id }));
});

test("a draft that is thrown away goes even when something was built on it", async () => {
  const ctx = org.as("engineer");
  const draft = await makeDraft(org, ctx);
  await createComment({ ctx, shapeId: draft.id, input: { text: "Soon" } });
  await createDrawing({ ctx, input: { name: "Early bird", drawing: builtFrom(draft.id) } });
  await discardRevision({ ctx, shapeId: draft.id, ordinal: 1, version: 1 });
  await expectRefused(org.db, "notFound", () => listShapeUses({ ctx, shapeId: draft.id }));
});
