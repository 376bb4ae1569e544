import { afterAll, beforeAll, expect, test } from "vitest";
import { createBay } from "@/lib/services/bay/create";
import { deleteBay } from "@/lib/services/bay/delete";
import { listBays } from "@/lib/services/bay/list";
import { updateBay } from "@/lib/services/bay/update";
import { createRightRequest } from "@/lib/services/right-request/create";
import { putRight } from "@/lib/services/right/put";
import { findShapes } from "@/lib/services/shape/find";
import { writeShapes } from "@/lib/services/shape/write-shapes";
import { rectangleDrawing, rectangleProperties } from "@/tests/helpers/rectangle-properties";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());
const librarian = () => org.as("librarian");

test("a librarian adds a bay at the end of the strip", async () => {
  const bay = await createBay({ ctx: librarian(), input: { name: "Boxes" } });
  expect(bay).toMatchObject({ name: "Boxes", ordinal: 3, counts: "computed", tolerance: 0.01, version: 1 });
  await expectLogged(org.db, "bay.create", bay.id, librarian().actor.userId);
});

test("engineers do not, a name is there once whatever its case, and a tolerance has its range", async () => {
  await expectRefused(org.db, "forbidden", () =>
    createBay({ ctx: org.as("engineer"), input: { name: "Mine" } }),
  );
  await expectRefused(org.db, "conflict", () =>
    createBay({ ctx: librarian(), input: { name: "plate GIRDERS" } }),
  );
  await expectRefused(org.db, "invalid", () =>
    createBay({ ctx: librarian(), input: { name: "T", tolerance: 0.9 } }),
  );
  await expectRefused(org.db, "invalid", () => createBay({ ctx: librarian(), input: { name: " " } }));
});

test("moved in the strip, the others make room and no number is doubled", async () => {
  const { items } = await listBays({ ctx: librarian() });
  const last = items.at(-1);
  await updateBay({
    ctx: librarian(),
    bayId: last?.id ?? "",
    version: last?.version ?? 0,
    input: { ordinal: 1 },
  });
  const after = (await listBays({ ctx: librarian() })).items;
  expect(after.map((bay) => bay.ordinal)).toEqual([1, 2, 3]);
  expect(after[0]?.id).toBe(last?.id);
});

test("another organisation's bay is not found, a stale change is refused", async () => {
  const [bayId] = org.bayIds;
  const change = { bayId, input: { name: "Theirs" } };
  await expectRefused(org.db, "notFound", () =>
    updateBay({ ctx: org.stranger("admin"), version: 1, ...change }),
  );
  await expectRefused(org.db, "stale", () => updateBay({ ctx: librarian(), version: 9, ...change }));
  await expectRefused(org.db, "notFound", () => deleteBay({ ctx: org.stranger("admin"), bayId, version: 1 }));
});

test("which figures count changes what the search finds, in the same transaction", async () => {
  const [, bayId] = org.bayIds;
  const computed = rectangleProperties(20, 200);
  await org.db.write((tx) =>
    writeShapes(tx, librarian(), [
      {
        existing: null,
        bayId,
        counts: "computed",
        family: "flat",
        designation: "FL 1",
        title: "",
        series: "S",
        drawing: rectangleDrawing(20, 200),
        note: "",
        computed,
        engineVersion: "t",
        tabulated: { Sx: 999_999, J: 42 },
        state: "released",
        deliveryId: null,
      },
    ]),
  );
  const row = async () => (await findShapes({ ctx: org.as("designer"), input: { q: "FL1" } })).items[0];
  expect(await row()).toMatchObject({ source: "computed", Sx: computed.Sx, J: 42 });
  const bay = (await listBays({ ctx: librarian() })).items.find((b) => b.id === bayId);
  await updateBay({ ctx: librarian(), bayId, version: bay?.version ?? 0, input: { counts: "tabulated" } });
  await expectLogged(org.db, "bay.update", bayId, librarian().actor.userId);
  expect(await row()).toMatchObject({ source: "tabulated", Sx: 999_999, Ix: computed.Ix });
});

test("a bay that holds shapes stays; an empty one goes", async () => {
  const { items } = await listBays({ ctx: librarian() });
  const full = items.find((bay) => bay.id === org.bayIds[1]);
  await expectRefused(org.db, "conflict", () =>
    deleteBay({ ctx: librarian(), bayId: org.bayIds[1], version: full?.version ?? 0 }),
  );
  const made = await createBay({ ctx: librarian(), input: { name: "Passing" } });
  await createRightRequest({
    ctx: org.as("designer"),
    input: { bayId: made.id, right: "draft", reason: "x" },
  });
  const memberId = org.actors.designer.membershipId;
  await putRight({ ctx: org.as("admin"), input: { memberId, bayId: made.id, right: "draft" } });
  await deleteBay({ ctx: librarian(), bayId: made.id, version: 1 });
  await expectLogged(org.db, "bay.delete", made.id, librarian().actor.userId);
});

test("the list tells the asker's own right in each bay", async () => {
  const raised = org.as("designer", { [org.bayIds[0]]: "release" });
  const rights = (await listBays({ ctx: raised })).items.map((bay) => [bay.id, bay.right]);
  expect(Object.fromEntries(rights)).toMatchObject({ [org.bayIds[0]]: "release", [org.bayIds[1]]: "read" });
});
