import { afterAll, beforeAll, expect, test } from "vitest";
import * as bays from "@/app/api/v1/bays/route";
import * as properties from "@/app/api/v1/properties/route";
import * as tokensRoute from "@/app/api/v1/tokens/route";
import { loadActor } from "@/lib/auth/load-actor";
import { createSession, readSession } from "@/lib/auth/sessions";
import { rightIn } from "@/lib/permissions";
import { endMemberSessions } from "@/lib/services/member/end-sessions";
import { updateMember } from "@/lib/services/member/update";
import { createRightRequest } from "@/lib/services/right-request/create";
import { decideRightRequest } from "@/lib/services/right-request/decide";
import { listRightRequests } from "@/lib/services/right-request/list";
import { endSession } from "@/lib/services/session/end";
import { listSessions } from "@/lib/services/session/list";
import { createToken } from "@/lib/services/token/create";
import { listTokens } from "@/lib/services/token/list";
import { revokeToken } from "@/lib/services/token/revoke";
import { callRoute, cookieFor, serveFrom, stopServing } from "@/tests/helpers/http";
import { newestLetter } from "@/tests/helpers/letters";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";
import { expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
  serveFrom(org.db);
});
afterAll(async () => {
  stopServing();
  await org.close();
});
const librarian = () => org.as("librarian");
const bearer = (token: string) => ({ authorization: `Bearer ${token}`, origin: "" });

test("a token is shown once, stored as a hash, and acts for its owner without an origin", async () => {
  const made = await createToken({ ctx: librarian(), input: { name: "export", may: "change", days: 30 } });
  await expectLogged(org.db, "token.create", made.id, librarian().actor.userId);
  const { rows } = await org.db.reader.execute("SELECT * FROM tokens");
  expect(JSON.stringify(rows)).not.toContain(made.token);
  expect(JSON.stringify(await listTokens({ ctx: librarian() }))).not.toContain(made.token);
  const post = { method: "POST", body: { name: "By a program" }, headers: bearer(made.token) };
  expect((await callRoute(bays.POST, post)).status).toBe(201);
});

test("a token that may read reads and computes, and changes nothing", async () => {
  const { token } = await createToken({ ctx: librarian(), input: { name: "sheets", may: "read", days: 30 } });
  const headers = bearer(token);
  expect((await callRoute(bays.GET, { headers })).status).toBe(200);
  const drawing = rectangleDrawing(10, 20);
  expect((await callRoute(properties.POST, { method: "POST", body: { drawing }, headers })).status).toBe(200);
  expect((await callRoute(bays.POST, { method: "POST", body: { name: "No" }, headers })).status).toBe(403);
});

test("its owner's rights count at the time of use: lowered, suspended, ended, revoked", async () => {
  const ctx = org.as("engineer");
  const { token, id } = await createToken({ ctx, input: { name: "calc", may: "change", days: 1 } });
  const get = async () => (await callRoute(bays.GET, { headers: bearer(token) })).status;
  expect(await get()).toBe(200);
  const suspend = (suspended: boolean, version: number) =>
    updateMember({ ctx: org.as("admin"), memberId: ctx.actor.membershipId, version, input: { suspended } });
  await suspend(true, 1);
  expect(await get()).toBe(401);
  await suspend(false, 2);
  expect(await get()).toBe(200);
  await expectRefused(org.db, "notFound", () => revokeToken({ ctx: org.as("designer"), tokenId: id }));
  await expectRefused(org.db, "notFound", () => revokeToken({ ctx: org.stranger("admin"), tokenId: id }));
  await revokeToken({ ctx: org.as("admin"), tokenId: id });
  await expectLogged(org.db, "token.revoke", id, org.as("admin").actor.userId);
  expect(await get()).toBe(401);
});

test("a wrong or empty Authorization is 401 even beside a good cookie, and a token makes no tokens", async () => {
  const cookie = await cookieFor(org.db, org.actors.librarian);
  for (const authorization of ["Bearer x", "Bearer ", "Basic abc", `Bearer ${"a".repeat(43)}`]) {
    expect((await callRoute(bays.GET, { cookie, headers: { authorization } })).status).toBe(401);
  }
  const { token } = await createToken({ ctx: librarian(), input: { name: "maker", may: "change", days: 1 } });
  const body = { name: "child", may: "change", days: 1 };
  const response = await callRoute(tokensRoute.POST, { method: "POST", body, headers: bearer(token) });
  expect(response.status).toBe(403);
});

test("a request for a right: letter to the admin, one click, the grant, letter to who asked", async () => {
  const ctx = org.as("designer");
  const [bayId] = org.bayIds;
  const input = { bayId, right: "draft" as const, reason: "Stiffeners for J2231" };
  const request = await createRightRequest({ ctx, input });
  await expectLogged(org.db, "rightRequest.create", request.id, ctx.actor.userId);
  const email = async (role: "admin" | "designer") =>
    String(
      (
        await org.db.reader.execute({
          sql: "SELECT email FROM users WHERE id = ?",
          args: [org.actors[role].userId],
        })
      ).rows[0]?.email,
    );
  expect((await newestLetter(org.db, await email("admin"))).text).toContain("Stiffeners for J2231");
  await expectRefused(org.db, "conflict", () => createRightRequest({ ctx, input }));
  const decide = { requestId: request.id, version: 1, input: { granted: true, answer: "For this job" } };
  await expectRefused(org.db, "forbidden", () => decideRightRequest({ ctx: org.as("librarian"), ...decide }));
  await expectRefused(org.db, "notFound", () =>
    decideRightRequest({ ctx: org.stranger("admin"), ...decide }),
  );
  const decided = await decideRightRequest({ ctx: org.as("admin"), ...decide });
  expect(decided).toMatchObject({ state: "granted", answer: "For this job" });
  await expectLogged(org.db, "rightRequest.decide", request.id, org.as("admin").actor.userId);
  const actor = await loadActor(org.db.read, { ...ctx.actor, via: "session" }, Date.now());
  expect(actor && rightIn(actor, bayId)).toBe("draft");
  expect((await newestLetter(org.db, await email("designer"))).subject).toContain("You now have the right");
  await expectRefused(org.db, "stale", () => decideRightRequest({ ctx: org.as("admin"), ...decide }));
  await expectRefused(org.db, "conflict", () =>
    decideRightRequest({ ctx: org.as("admin"), ...decide, version: 2 }),
  );
  expect((await listRightRequests({ ctx: org.as("engineer") })).items).toEqual([]);
  expect((await listRightRequests({ ctx: org.as("admin") })).items).toHaveLength(1);
});

test("nobody asks for what they have, nor for a bay of others, nor without a reason", async () => {
  const [bayId] = org.bayIds;
  await expectRefused(org.db, "conflict", () =>
    createRightRequest({ ctx: org.as("engineer"), input: { bayId, right: "draft", reason: "x" } }),
  );
  await expectRefused(org.db, "notFound", () =>
    createRightRequest({ ctx: org.stranger("designer"), input: { bayId, right: "draft", reason: "x" } }),
  );
  await expectRefused(org.db, "invalid", () =>
    createRightRequest({ ctx: org.as("engineer"), input: { bayId, right: "release", reason: " " } }),
  );
});

test("one's own sessions are listed and ended one by one; an admin ends all of a member's", async () => {
  const ctx = org.as("engineer");
  const open = () => createSession(org.db, { ...ctx.actor, userAgent: "browser" }, Date.now());
  const [a, b] = [await open(), await open()];
  const { items } = await listSessions({ ctx, sessionId: a.publicId });
  expect(items.map((s) => s.current).sort()).toEqual([false, true]);
  await expectRefused(org.db, "notFound", () => endSession({ ctx: org.as("admin"), publicId: b.publicId }));
  await endSession({ ctx, publicId: b.publicId });
  await expectLogged(org.db, "session.end", b.publicId, ctx.actor.userId);
  expect(await readSession(org.db, b.token)).toBeNull();
  await expectRefused(org.db, "notFound", () =>
    endMemberSessions({ ctx: org.stranger("admin"), memberId: ctx.actor.membershipId }),
  );
  await endMemberSessions({ ctx: org.as("admin"), memberId: ctx.actor.membershipId });
  expect(await readSession(org.db, a.token)).toBeNull();
});
