import { afterAll, beforeAll, expect, test } from "vitest";
import { checkRevision } from "@/lib/services/revision/check";
import { createRevision } from "@/lib/services/revision/create";
import { discardRevision } from "@/lib/services/revision/discard";
import { listRevisions } from "@/lib/services/revision/list";
import { releaseRevision } from "@/lib/services/revision/release";
import { sendBackRevision } from "@/lib/services/revision/send-back";
import { submitRevision } from "@/lib/services/revision/submit";
import { updateRevision } from "@/lib/services/revision/update";
import { withdrawRevision } from "@/lib/services/revision/withdraw";
import { findShapes } from "@/lib/services/shape/find";
import { showShape } from "@/lib/services/shape/show";
import { updateOrganisation } from "@/lib/services/organisation/update";
import { expectRel } from "@/tests/helpers/expect-rel";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";
import { makeDraft, makeReleased, makeSubmitted } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());

const engineer = () => org.as("engineer");
const librarian = () => org.as("librarian");
const first = (id: string, version: number) => ({ shapeId: id, ordinal: 1, version });

test("drafted, submitted, checked, released: each step logged, and only then does a designer find it", async () => {
  const designer = org.as("designer");
  const draft = await makeDraft(org, engineer(), { depth: 333 });
  const seen = async () =>
    (await findShapes({ ctx: designer, input: { minDepth: "333", maxDepth: "333" } })).items;
  await expect(showShape({ ctx: designer, shapeId: draft.id })).rejects.toMatchObject({ code: "notFound" });
  const submitted = await submitRevision({ ctx: engineer(), ...first(draft.id, 1) });
  await expectLogged(org.db, "revision.submit", draft.id, engineer().actor.userId);
  const checked = await checkRevision({
    ctx: librarian(),
    ...first(draft.id, submitted.version),
    input: { how: "independent calculation", note: "S by hand" },
  });
  expect(checked.checked).toMatchObject({ how: "independent calculation", note: "S by hand" });
  await expectLogged(org.db, "revision.check", draft.id, librarian().actor.userId);
  expect(await seen()).toEqual([]);
  const released = await releaseRevision({ ctx: librarian(), ...first(draft.id, checked.version) });
  expect(released.state).toBe("released");
  await expectLogged(org.db, "revision.release", draft.id, librarian().actor.userId);
  expect((await seen()).map((row) => row.id)).toEqual([draft.id]);
  expect((await showShape({ ctx: designer, shapeId: draft.id })).revision.may).toEqual({
    edit: false,
    submit: false,
    check: false,
    sendBack: false,
    release: false,
    withdraw: false,
    revise: false,
  });
});

test("an engineer submits but may not release; a designer may not even submit", async () => {
  const { id, revision } = await makeSubmitted(org, engineer());
  await expectRefused(org.db, "forbidden", () =>
    releaseRevision({ ctx: engineer(), ...first(id, revision.version) }),
  );
  await expectRefused(org.db, "forbidden", () =>
    submitRevision({ ctx: org.as("designer"), ...first(id, revision.version) }),
  );
});

test("four eyes: who edited cannot check, and what nobody else checked cannot be released", async () => {
  const { id, revision } = await makeSubmitted(org, librarian());
  await expectRefused(org.db, "forbidden", () =>
    checkRevision({ ctx: librarian(), ...first(id, revision.version), input: { how: "review" } }),
  );
  await expectRefused(org.db, "conflict", () =>
    releaseRevision({ ctx: librarian(), ...first(id, revision.version) }),
  );
  const checked = await checkRevision({
    ctx: engineer(),
    ...first(id, revision.version),
    input: { how: "review" },
  });
  await expect(releaseRevision({ ctx: librarian(), ...first(id, checked.version) })).resolves.toBeDefined();
});

test("an organisation may switch four eyes off; then one person may do it all", async () => {
  const own = await testOrganisation({ closesItself: true });
  await updateOrganisation({ ctx: own.as("admin"), version: 1, input: { fourEyes: false } });
  const { id, revision } = await makeSubmitted(own, own.as("librarian"));
  await expect(
    releaseRevision({ ctx: own.as("librarian"), ...first(id, revision.version) }),
  ).resolves.toMatchObject({
    state: "released",
  });
});

test("sent back with a reason it is a draft again, and a check made before no longer counts", async () => {
  const { id, revision } = await makeSubmitted(org, engineer());
  const checked = await checkRevision({
    ctx: librarian(),
    ...first(id, revision.version),
    input: { how: "review" },
  });
  await expectRefused(org.db, "invalid", () =>
    sendBackRevision({ ctx: librarian(), ...first(id, checked.version), input: { reason: " " } }),
  );
  const back = await sendBackRevision({
    ctx: librarian(),
    ...first(id, checked.version),
    input: { reason: "Show the web splice" },
  });
  expect(back).toMatchObject({ state: "draft", checked: null, sentBack: { reason: "Show the web splice" } });
  await expectLogged(org.db, "revision.sendBack", id, librarian().actor.userId);
});

test("a draft's new drawing brings new figures and names its editor; from submitted on nothing changes", async () => {
  const draft = await makeDraft(org, engineer(), { depth: 200 });
  const saved = await updateRevision({
    ctx: librarian(),
    ...first(draft.id, 1),
    input: { drawing: rectangleDrawing(20, 260), note: "Deeper" },
  });
  expectRel(saved.computed.Ix, (20 * 260 ** 3) / 12, { rel: 1e-12 });
  expect(saved.editors.map((person) => person.name)).toEqual(["Test engineer", "Test librarian"]);
  expect(saved.contentHash).not.toBe(draft.revision.contentHash);
  await expectLogged(org.db, "revision.update", draft.id, librarian().actor.userId);
  const submitted = await submitRevision({ ctx: engineer(), ...first(draft.id, saved.version) });
  await expectRefused(org.db, "conflict", () =>
    updateRevision({ ctx: engineer(), ...first(draft.id, submitted.version), input: { note: "late" } }),
  );
  const forced = org.db.write((tx) =>
    tx.raw.execute({ sql: "UPDATE revisions SET drawing = '{}' WHERE shape_id = ?", args: [draft.id] }),
  );
  await expect(forced).rejects.toThrow(/never changes/);
});

test("a new revision supersedes the released one when it is released, and both stay readable", async () => {
  const { id } = await makeReleased(org, { depth: 210 });
  const sheet = await showShape({ ctx: engineer(), shapeId: id });
  const b = await createRevision({
    ctx: engineer(),
    shapeId: id,
    version: sheet.version,
    input: { drawing: rectangleDrawing(20, 240), note: "Deeper" },
  });
  expect(b).toMatchObject({ ordinal: 2, letter: "B", state: "draft" });
  await expectLogged(org.db, "revision.create", id, engineer().actor.userId);
  await expectRefused(org.db, "conflict", async () =>
    createRevision({
      ctx: engineer(),
      shapeId: id,
      version: (await showShape({ ctx: engineer(), shapeId: id })).version,
      input: { drawing: rectangleDrawing(20, 250) },
    }),
  );
  const submitted = await submitRevision({ ctx: engineer(), shapeId: id, ordinal: 2, version: b.version });
  const checked = await checkRevision({
    ctx: librarian(),
    shapeId: id,
    ordinal: 2,
    version: submitted.version,
    input: { how: "review" },
  });
  await releaseRevision({ ctx: librarian(), shapeId: id, ordinal: 2, version: checked.version });
  const { items } = await listRevisions({ ctx: org.as("designer"), shapeId: id });
  expect(items.map(({ letter, state }) => [letter, state])).toEqual([
    ["B", "released"],
    ["A", "superseded"],
  ]);
  const old = await showShape({ ctx: org.as("designer"), shapeId: id, ordinal: 1 });
  expectRel(old.revision.computed.Ix, (20 * 210 ** 3) / 12, { rel: 1e-12 });
});

test("withdrawn with reason and replacement: gone from the search, still on its sheet", async () => {
  const { id, revision } = await makeReleased(org, { depth: 444 });
  const other = await makeReleased(org);
  await expectRefused(org.db, "forbidden", () =>
    withdrawRevision({ ctx: engineer(), ...first(id, revision.version), input: { reason: "x" } }),
  );
  await expectRefused(org.db, "invalid", () =>
    withdrawRevision({
      ctx: librarian(),
      ...first(id, revision.version),
      input: { reason: "Rolled no longer", replacementShapeId: id },
    }),
  );
  const gone = await withdrawRevision({
    ctx: librarian(),
    ...first(id, revision.version),
    input: { reason: "Rolled no longer", replacementShapeId: other.id },
  });
  expect(gone.withdrawn).toMatchObject({ reason: "Rolled no longer", replacement: { id: other.id } });
  await expectLogged(org.db, "revision.withdraw", id, librarian().actor.userId);
  const depth = { minDepth: "444", maxDepth: "444" };
  const designer = org.as("designer");
  expect((await findShapes({ ctx: designer, input: depth })).items).toEqual([]);
  expect((await findShapes({ ctx: designer, input: { ...depth, state: "withdrawn" } })).items).toHaveLength(
    1,
  );
  expect((await showShape({ ctx: designer, shapeId: id })).revision.state).toBe("withdrawn");
});

test("every step is not found for another organisation and stale with an old version", async () => {
  const { id, revision } = await makeSubmitted(org, engineer());
  const stranger = org.stranger("admin");
  const old = first(id, revision.version - 1);
  const now = first(id, revision.version);
  await expectRefused(org.db, "notFound", () => submitRevision({ ctx: stranger, ...now }));
  await expectRefused(org.db, "notFound", () =>
    checkRevision({ ctx: stranger, ...now, input: { how: "review" } }),
  );
  await expectRefused(org.db, "notFound", () =>
    sendBackRevision({ ctx: stranger, ...now, input: { reason: "x" } }),
  );
  await expectRefused(org.db, "notFound", () => releaseRevision({ ctx: stranger, ...now }));
  await expectRefused(org.db, "notFound", () =>
    withdrawRevision({ ctx: stranger, ...now, input: { reason: "x" } }),
  );
  await expectRefused(org.db, "notFound", () =>
    updateRevision({ ctx: stranger, ...now, input: { note: "x" } }),
  );
  await expectRefused(org.db, "notFound", () => discardRevision({ ctx: stranger, ...now }));
  await expectRefused(org.db, "notFound", () =>
    createRevision({ ctx: stranger, shapeId: id, version: 1, input: { drawing: rectangleDrawing(1, 2) } }),
  );
  await expectRefused(org.db, "stale", () =>
    checkRevision({ ctx: librarian(), ...old, input: { how: "review" } }),
  );
  await expectRefused(org.db, "stale", () => releaseRevision({ ctx: librarian(), ...old }));
});

test("of sixteen who save one draft at once exactly one wins, and the figures are those of the winner", async () => {
  const draft = await makeDraft(org, engineer());
  const results = await Promise.allSettled(
    Array.from({ length: 16 }, (_, i) =>
      updateRevision({
        ctx: engineer(),
        ...first(draft.id, 1),
        input: { drawing: rectangleDrawing(20, 500 + i) },
      }),
    ),
  );
  const won = results.filter((r) => r.status === "fulfilled");
  expect(won).toHaveLength(1);
  const stored = await showShape({ ctx: engineer(), shapeId: draft.id });
  expect(stored.revision.computed.Ix).toBe(won[0]?.value.computed.Ix);
  for (const r of results) if (r.status === "rejected") expect(r.reason).toMatchObject({ code: "stale" });
});

test("a first draft that is thrown away takes its shape with it, a later one leaves what is released", async () => {
  const draft = await makeDraft(org, engineer(), { designation: "GONE 1" });
  await discardRevision({ ctx: engineer(), ...first(draft.id, 1) });
  await expectLogged(org.db, "revision.discard", draft.id, engineer().actor.userId);
  await expect(makeDraft(org, engineer(), { designation: "GONE 1" })).resolves.toBeDefined();
  const { id } = await makeReleased(org);
  const sheet = await showShape({ ctx: engineer(), shapeId: id });
  const input = { drawing: rectangleDrawing(20, 99) };
  const b = await createRevision({ ctx: engineer(), shapeId: id, version: sheet.version, input });
  await discardRevision({ ctx: engineer(), shapeId: id, ordinal: 2, version: b.version });
  const after = await showShape({ ctx: engineer(), shapeId: id });
  expect(after).toMatchObject({ releasedOrdinal: 1, workingOrdinal: null });
});
