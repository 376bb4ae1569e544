import { afterAll, beforeAll, expect, test } from "vitest";
import { createComment } from "@/lib/services/comment/create";
import { deleteComment } from "@/lib/services/comment/delete";
import { listComments } from "@/lib/services/comment/list";
import { findShapes } from "@/lib/services/shape/find";
import { listShapeDeeds } from "@/lib/services/shape/deeds";
import { createTake } from "@/lib/services/take/create";
import { deleteTake } from "@/lib/services/take/delete";
import { listTakes } from "@/lib/services/take/list";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { makeDraft, makeReleased } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());
const designer = () => org.as("designer");
const input = { ordinal: 1, jobNumber: "J2231", jobName: "Footbridge", quantity: 8, lengthMm: 11_400 };

test("a designer records that a job took the released revision; the Rack counts jobs, not takes", async () => {
  const { id } = await makeReleased(org);
  const take = await createTake({ ctx: designer(), shapeId: id, input });
  expect(take).toMatchObject({
    letter: "A",
    jobNumber: "J2231",
    quantity: 8,
    lengthMm: 11_400,
    pieceMark: "",
  });
  await expectLogged(org.db, "take.create", id, designer().actor.userId);
  await createTake({ ctx: designer(), shapeId: id, input: { ...input, pieceMark: "B2" } });
  await createTake({ ctx: designer(), shapeId: id, input: { ...input, jobNumber: "J2260" } });
  expect((await listTakes({ ctx: designer(), shapeId: id })).items).toHaveLength(3);
  const rows = async (job: string) => (await findShapes({ ctx: designer(), input: { job } })).items;
  expect((await rows("J2260")).map((row) => [row.id, row.jobs])).toEqual([[id, 2]]);
  expect(await rows("J9999")).toEqual([]);
});

test("only what is released can be taken, by number and length that can be cut", async () => {
  const draft = await makeDraft(org, org.as("engineer"));
  await expectRefused(org.db, "conflict", () =>
    createTake({ ctx: org.as("engineer"), shapeId: draft.id, input }),
  );
  await expectRefused(org.db, "notFound", () => createTake({ ctx: designer(), shapeId: draft.id, input }));
  const { id } = await makeReleased(org);
  for (const wrong of [
    { quantity: 0 },
    { quantity: 1.5 },
    { lengthMm: -1 },
    { jobNumber: " " },
    { by: "me" },
  ]) {
    await expectRefused(org.db, "invalid", () =>
      createTake({ ctx: designer(), shapeId: id, input: { ...input, ...wrong } }),
    );
  }
  await expectRefused(org.db, "notFound", () =>
    createTake({ ctx: org.stranger("designer"), shapeId: id, input }),
  );
});

test("a take is taken off by who recorded it or who may release, and the count follows", async () => {
  const { id } = await makeReleased(org);
  const take = await createTake({ ctx: designer(), shapeId: id, input });
  const address = { shapeId: id, takeId: take.id };
  await expectRefused(org.db, "forbidden", () => deleteTake({ ctx: org.as("engineer"), ...address }));
  await expectRefused(org.db, "notFound", () => deleteTake({ ctx: org.stranger("admin"), ...address }));
  await deleteTake({ ctx: org.as("librarian"), ...address });
  await expectLogged(org.db, "take.delete", id, org.as("librarian").actor.userId);
  expect(
    (await findShapes({ ctx: designer(), input: { job: "J2231" } })).items.map((r) => r.id),
  ).not.toContain(id);
});

test("comments are read by who sees the revision, written by members, taken back by their author", async () => {
  const { id } = await makeReleased(org);
  const said = await createComment({ ctx: designer(), shapeId: id, input: { text: " Camber by job " } });
  expect(said).toMatchObject({ text: "Camber by job", letter: "A" });
  await expectLogged(org.db, "comment.create", id, designer().actor.userId);
  const address = { shapeId: id, commentId: said.id };
  await expectRefused(org.db, "forbidden", () => deleteComment({ ctx: org.as("admin"), ...address }));
  await expectRefused(org.db, "notFound", () => deleteComment({ ctx: org.stranger("designer"), ...address }));
  await expectRefused(org.db, "invalid", () =>
    createComment({ ctx: designer(), shapeId: id, input: { text: "x".repeat(4001) } }),
  );
  await expectRefused(org.db, "notFound", () =>
    createComment({ ctx: org.stranger("designer"), shapeId: id, input: { text: "hello" } }),
  );
  await deleteComment({ ctx: designer(), ...address });
  await expectLogged(org.db, "comment.delete", id, designer().actor.userId);
  expect((await listComments({ ctx: designer(), shapeId: id })).items).toEqual([]);
});

test("the deeds of a shape are told in words, those on drafts only to who may draft", async () => {
  const { id } = await makeReleased(org);
  const told = async (role: "designer" | "engineer") =>
    (await listShapeDeeds({ ctx: org.as(role), shapeId: id })).items.map((deed) => deed.verb);
  expect(await told("designer")).toEqual(["released"]);
  expect(await told("engineer")).toEqual(["released", "checked", "submitted", "drafted"]);
});
