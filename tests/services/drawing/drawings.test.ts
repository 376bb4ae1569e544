import { afterAll, beforeAll, expect, test } from "vitest";
import { createDrawing } from "@/lib/services/drawing/create";
import { deleteDrawing } from "@/lib/services/drawing/delete";
import { duplicateDrawing } from "@/lib/services/drawing/duplicate";
import { listDrawings } from "@/lib/services/drawing/list";
import { restoreDrawing } from "@/lib/services/drawing/restore";
import { showDrawing } from "@/lib/services/drawing/show";
import { updateDrawing } from "@/lib/services/drawing/update";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());
const mine = () => org.as("designer");
const make = (name = "Girder") =>
  createDrawing({ ctx: mine(), input: { name, drawing: rectangleDrawing(10, 90) } });

test("a drawing is kept as it was sent, even one that cannot be computed yet", async () => {
  const empty = { ...rectangleDrawing(10, 90), parts: [] };
  const kept = await createDrawing({ ctx: mine(), input: { name: "Begun", drawing: empty } });
  expect(kept).toMatchObject({ name: "Begun", parts: 0, version: 1, drawing: empty });
  await expectLogged(org.db, "drawing.create", kept.id, mine().actor.userId);
});

test("it is private: not even an admin of the firm sees it, nor a stranger", async () => {
  const { id } = await make();
  for (const ctx of [org.as("admin"), org.as("engineer"), org.stranger("designer")]) {
    await expectRefused(org.db, "notFound", () => showDrawing({ ctx, drawingId: id }));
    await expectRefused(org.db, "notFound", () =>
      updateDrawing({ ctx, drawingId: id, version: 1, input: { name: "x" } }),
    );
    await expectRefused(org.db, "notFound", () => deleteDrawing({ ctx, drawingId: id, version: 1 }));
    await expectRefused(org.db, "notFound", () => duplicateDrawing({ ctx, drawingId: id }));
    await expectRefused(org.db, "notFound", () => restoreDrawing({ ctx, drawingId: id }));
  }
  expect((await listDrawings({ ctx: org.as("admin"), input: {} })).items).toEqual([]);
});

test("of two windows the second to save is told, and the first state stands", async () => {
  const { id } = await make();
  const save = (depth: number) =>
    updateDrawing({
      ctx: mine(),
      drawingId: id,
      version: 1,
      input: { drawing: rectangleDrawing(10, depth) },
    });
  const first = await save(100);
  expect(first.version).toBe(2);
  await expectLogged(org.db, "drawing.update", id, mine().actor.userId);
  await expectRefused(org.db, "stale", () => save(110));
  expect((await showDrawing({ ctx: mine(), drawingId: id })).drawing).toEqual(rectangleDrawing(10, 100));
});

test("deleted it is gone from the list, undone it is back with all it held", async () => {
  const { id } = await make("To be deleted");
  await deleteDrawing({ ctx: mine(), drawingId: id, version: 1 });
  await expectLogged(org.db, "drawing.delete", id, mine().actor.userId);
  await expectRefused(org.db, "notFound", () => showDrawing({ ctx: mine(), drawingId: id }));
  const back = await restoreDrawing({ ctx: mine(), drawingId: id });
  await expectLogged(org.db, "drawing.restore", id, mine().actor.userId);
  expect(back).toMatchObject({ name: "To be deleted", drawing: rectangleDrawing(10, 90) });
});

test("a copy is a drawing of its own", async () => {
  const { id } = await make("Original");
  const copy = await duplicateDrawing({ ctx: mine(), drawingId: id });
  expect(copy).toMatchObject({ name: "Original (copy)", version: 1, drawing: rectangleDrawing(10, 90) });
  await updateDrawing({ ctx: mine(), drawingId: copy.id, version: 1, input: { name: "Copy" } });
  expect((await showDrawing({ ctx: mine(), drawingId: id })).name).toBe("Original");
});

test("the list is paged, the one last saved first", async () => {
  const own = await testOrganisation({ closesItself: true });
  for (let i = 0; i < 5; i += 1) {
    await createDrawing({
      ctx: { ...own.as("engineer"), now: 1_000 + i },
      input: { name: `D${i}`, drawing: rectangleDrawing(1, 2) },
    });
  }
  const first = await listDrawings({ ctx: own.as("engineer"), input: { limit: "3" } });
  const second = await listDrawings({
    ctx: own.as("engineer"),
    input: { limit: "3", cursor: first.next ?? "" },
  });
  expect([...first.items, ...second.items].map((d) => d.name)).toEqual(["D4", "D3", "D2", "D1", "D0"]);
  expect(second.next).toBeNull();
});

test.each([
  ["a blank name", { name: "  " }],
  ["a name with a control character", { name: "a\u0000b" }],
  ["a foreign field", { ownerId: "x" }],
  ["a material that is no number", { drawing: { ...rectangleDrawing(1, 2), materials: [] } }],
])("%s is refused", async (_what, wrong) => {
  const input = { name: "N", drawing: rectangleDrawing(1, 2), ...(wrong as object) };
  await expectRefused(org.db, "invalid", () => createDrawing({ ctx: mine(), input }));
});
