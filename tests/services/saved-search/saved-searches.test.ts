import { afterAll, beforeAll, expect, test } from "vitest";
import { createSavedSearch } from "@/lib/services/saved-search/create";
import { deleteSavedSearch } from "@/lib/services/saved-search/delete";
import { listSavedSearches } from "@/lib/services/saved-search/list";
import { updateSavedSearch } from "@/lib/services/saved-search/update";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());
const mine = () => org.as("designer");

test("a search is kept under a name for oneself alone", async () => {
  const input = { name: "Crane beams", query: "minSx=2000000&maxDepth=620&sort=mass" };
  const saved = await createSavedSearch({ ctx: mine(), input });
  await expectLogged(org.db, "savedSearch.create", saved.id, mine().actor.userId);
  expect((await listSavedSearches({ ctx: mine() })).items).toEqual([{ ...input, id: saved.id, version: 1 }]);
  expect((await listSavedSearches({ ctx: org.as("admin") })).items).toEqual([]);
  await expectRefused(org.db, "conflict", () =>
    createSavedSearch({ ctx: mine(), input: { ...input, name: "CRANE beams" } }),
  );
  await expectRefused(org.db, "invalid", () =>
    createSavedSearch({ ctx: mine(), input: { name: "x", query: "<script>" } }),
  );
});

test("renamed and deleted by its owner only, from the state they saw", async () => {
  const saved = await createSavedSearch({
    ctx: mine(),
    input: { name: "Boxes", query: "family=box-girder" },
  });
  const address = { savedSearchId: saved.id, version: 1 };
  for (const ctx of [org.as("admin"), org.stranger("designer")]) {
    await expectRefused(org.db, "notFound", () =>
      updateSavedSearch({ ctx, ...address, input: { name: "x" } }),
    );
    await expectRefused(org.db, "notFound", () => deleteSavedSearch({ ctx, ...address }));
  }
  const renamed = await updateSavedSearch({ ctx: mine(), ...address, input: { name: "Box girders" } });
  expect(renamed).toMatchObject({ name: "Box girders", version: 2 });
  await expectLogged(org.db, "savedSearch.update", saved.id, mine().actor.userId);
  await expectRefused(org.db, "stale", () => deleteSavedSearch({ ctx: mine(), ...address }));
  await deleteSavedSearch({ ctx: mine(), savedSearchId: saved.id, version: 2 });
  await expectLogged(org.db, "savedSearch.delete", saved.id, mine().actor.userId);
});
