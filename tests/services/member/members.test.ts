import Papa from "papaparse";
import { afterAll, beforeAll, expect, test } from "vitest";
import { loadActor } from "@/lib/auth/load-actor";
import { rightIn } from "@/lib/permissions";
import { exportLog } from "@/lib/services/log/export";
import { listLog } from "@/lib/services/log/list";
import { listMembers } from "@/lib/services/member/list";
import { updateMember } from "@/lib/services/member/update";
import { updateOrganisation } from "@/lib/services/organisation/update";
import { putRight } from "@/lib/services/right/put";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());
const admin = () => org.as("admin");
const idOf = (role: "designer" | "engineer" | "admin") => org.actors[role].membershipId;
const now = (role: "designer" | "engineer") =>
  loadActor(
    org.db.read,
    { userId: org.actors[role].userId, organisationId: org.organisationId, via: "session" },
    Date.now(),
  );
const versionOf = async (memberId: string) =>
  (await listMembers({ ctx: admin() })).items.find((m) => m.id === memberId)?.version ?? 0;

test("an admin raises a right in one bay; it holds for the next load of the actor, and the deed is logged", async () => {
  const [bayId, other] = org.bayIds;
  await putRight({ ctx: admin(), input: { memberId: idOf("designer"), bayId, right: "draft" } });
  await expectLogged(org.db, "right.put", idOf("designer"), admin().actor.userId);
  const actor = await now("designer");
  expect(actor && [rightIn(actor, bayId), rightIn(actor, other)]).toEqual(["draft", "read"]);
  const member = (await listMembers({ ctx: admin() })).items.find((m) => m.id === idOf("designer"));
  expect(member?.grants).toEqual([expect.objectContaining({ bayId, right: "draft", until: null })]);
});

test("a second grant replaces the first, null takes it away, and an end date ends it", async () => {
  const [bayId] = org.bayIds;
  const put = (right: "read" | "release" | null, until?: string) =>
    putRight({
      ctx: admin(),
      input: { memberId: idOf("engineer"), bayId, right, ...(until !== undefined && { until }) },
    });
  await put("read");
  const { items } = await put("release");
  expect(items.filter((grant) => grant.memberId === idOf("engineer"))).toHaveLength(1);
  await put("release", new Date(Date.now() + 60_000).toISOString());
  const later = await loadActor(
    org.db.read,
    { userId: org.actors.engineer.userId, organisationId: org.organisationId, via: "session" },
    Date.now() + 61_000,
  );
  expect(later && rightIn(later, bayId)).toBe("draft");
  await put(null);
  const actor = await now("engineer");
  expect(actor && rightIn(actor, bayId)).toBe("draft");
  await expectRefused(org.db, "invalid", () => put("read", "2020-01-01T00:00:00Z"));
});

test("only admins grant, only to members and in bays of their own organisation", async () => {
  const input = { memberId: idOf("designer"), bayId: org.bayIds[0], right: "release" as const };
  for (const role of ["designer", "engineer", "librarian"] as const) {
    await expectRefused(org.db, "forbidden", () =>
      putRight({ ctx: org.as(role, { all: "release" }), input }),
    );
  }
  const stranger = org.stranger("admin");
  await expectRefused(org.db, "notFound", () => putRight({ ctx: stranger, input }));
  await expectRefused(org.db, "notFound", () =>
    putRight({ ctx: stranger, input: { ...input, memberId: stranger.actor.membershipId } }),
  );
});

test("a changed role counts at once, a suspended member is nobody, a restored one is back", async () => {
  const memberId = idOf("engineer");
  const change = async (input: { role?: "librarian" | "engineer"; suspended?: boolean }) =>
    updateMember({ ctx: admin(), memberId, version: await versionOf(memberId), input });
  await change({ role: "librarian" });
  expect((await now("engineer"))?.role).toBe("librarian");
  await expectLogged(org.db, "member.update", memberId, admin().actor.userId);
  await change({ suspended: true });
  expect(await now("engineer")).toBeNull();
  await change({ suspended: false, role: "engineer" });
  expect((await now("engineer"))?.role).toBe("engineer");
});

test("the last admin stays an admin and is not suspended, also when two step down at once", async () => {
  const memberId = idOf("admin");
  const version = await versionOf(memberId);
  await expectRefused(org.db, "conflict", () =>
    updateMember({ ctx: admin(), memberId, version, input: { role: "engineer" } }),
  );
  await expectRefused(org.db, "conflict", () =>
    updateMember({ ctx: admin(), memberId, version, input: { suspended: true } }),
  );
  const second = idOf("designer");
  await updateMember({
    ctx: admin(),
    memberId: second,
    version: await versionOf(second),
    input: { role: "admin" },
  });
  const down = async (id: string) =>
    updateMember({ ctx: admin(), memberId: id, version: await versionOf(id), input: { role: "designer" } });
  const results = await Promise.allSettled([down(memberId), down(second)]);
  expect(results.map((r) => r.status).sort()).toEqual(["fulfilled", "rejected"]);
  const admins = (await listMembers({ ctx: admin() })).items.filter((m) => m.role === "admin");
  expect(admins).toHaveLength(1);
});

test("members of another organisation are not found, and the list holds only one's own", async () => {
  await expectRefused(org.db, "notFound", () =>
    updateMember({
      ctx: org.stranger("admin"),
      memberId: idOf("engineer"),
      version: 1,
      input: { role: "admin" },
    }),
  );
  const { items } = await listMembers({ ctx: admin() });
  expect(items).toHaveLength(4);
  expect(JSON.stringify(items)).not.toMatch(/password|hash/i);
  await expect(listMembers({ ctx: org.as("librarian") })).rejects.toMatchObject({ code: "forbidden" });
});

test("the log is for admins, newest first, in pages, and cannot be changed by SQL", async () => {
  await updateOrganisation({ ctx: admin(), version: 1, input: { name: "Renamed Works" } });
  const first = await listLog({ ctx: admin(), input: { limit: "2" } });
  expect(first.items[0]).toMatchObject({ verb: "organisation.update", after: { name: "Renamed Works" } });
  const second = await listLog({ ctx: admin(), input: { limit: "2", cursor: first.next ?? "" } });
  const ids = [...first.items, ...second.items].map((entry) => entry.id);
  expect(new Set(ids).size).toBe(4);
  expect([...ids].sort().reverse()).toEqual(ids);
  await expect(listLog({ ctx: org.as("librarian"), input: {} })).rejects.toMatchObject({ code: "forbidden" });
  expect((await listLog({ ctx: org.stranger("admin"), input: {} })).items).toEqual([]);
  for (const sql of ["UPDATE log SET actor_name = 'x'", "DELETE FROM log"]) {
    await expect(org.db.write((tx) => tx.raw.execute(sql))).rejects.toThrow(/append-only/);
  }
});

test("the log is exported whole, for admins, with cells that no spreadsheet runs", async () => {
  await updateOrganisation({ ctx: admin(), version: 2, input: { address: "1 Quay", name: "=cmd()" } });
  let text = "";
  for await (const piece of await exportLog({ ctx: admin(), input: {} })) text += piece;
  const { data } = Papa.parse<string[]>(text.trim().replace(/^\ufeff/, ""));
  const { rows } = await org.db.reader.execute({
    sql: "SELECT count(*) FROM log WHERE organisation_id = ?",
    args: [org.organisationId],
  });
  expect(data).toHaveLength(Number(rows[0]?.[0]) + 1);
  expect(data[1]?.[3]).toBe("'=cmd()");
  await expect(exportLog({ ctx: org.as("librarian"), input: {} })).rejects.toMatchObject({
    code: "forbidden",
  });
});
