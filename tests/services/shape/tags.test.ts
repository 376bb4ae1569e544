import { afterAll, beforeAll, expect, test } from "vitest";
import { findShapes } from "@/lib/services/shape/find";
import { showShape } from "@/lib/services/shape/show";
import { putTags } from "@/lib/services/tag/put";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { makeReleased } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());

test("tags are put by who may draft, found whatever their case, and counted once", async () => {
  const { id } = await makeReleased(org);
  await makeReleased(org);
  const ctx = org.as("engineer");
  const put = async (tags: string[]) =>
    putTags({ ctx, shapeId: id, version: (await showShape({ ctx, shapeId: id })).version, input: { tags } });
  expect((await put(["Weathering steel", "weathering STEEL", "crane"])).tags).toEqual([
    "crane",
    "weathering STEEL",
  ]);
  await expectLogged(org.db, "shape.tag", id, ctx.actor.userId);
  const tagged = async (tag: string) =>
    (await findShapes({ ctx: org.as("designer"), input: { tag, include: "counts" } })).items.map(
      (row) => row.id,
    );
  expect(await tagged("CRANE")).toEqual([id]);
  await put([]);
  expect(await tagged("crane")).toEqual([]);
});

test("designers, strangers, stale states and tags with a comma are refused", async () => {
  const { id } = await makeReleased(org);
  const { version } = await showShape({ ctx: org.as("engineer"), shapeId: id });
  const put = (ctx: ReturnType<typeof org.as>, tags: string[], at = version) =>
    putTags({ ctx, shapeId: id, version: at, input: { tags } });
  await expectRefused(org.db, "forbidden", () => put(org.as("designer"), ["x"]));
  await expectRefused(org.db, "notFound", () => put(org.stranger("admin"), ["x"]));
  await expectRefused(org.db, "stale", () => put(org.as("engineer"), ["x"], version - 1));
  await expectRefused(org.db, "invalid", () => put(org.as("engineer"), ["a,b"]));
});
