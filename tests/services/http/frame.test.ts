import { afterAll, beforeAll, expect, test } from "vitest";
import * as bays from "@/app/api/v1/bays/route";
import * as drawing from "@/app/api/v1/drawings/[id]/route";
import * as me from "@/app/api/v1/me/route";
import * as properties from "@/app/api/v1/properties/route";
import * as rights from "@/app/api/v1/rights/route";
import * as shape from "@/app/api/v1/shapes/[id]/route";
import { newId } from "@/lib/services/new-id";
import { callRoute, cookieFor, ORIGIN, serveFrom, stopServing } from "@/tests/helpers/http";
import { expectRel } from "@/tests/helpers/expect-rel";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";
import { everything } from "@/tests/helpers/refuses";
import { makeReleased } from "@/tests/helpers/shapes";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
let admin: string;
let designer: string;
let stranger: string;

beforeAll(async () => {
  org = await testOrganisation();
  serveFrom(org.db);
  admin = await cookieFor(org.db, org.actors.admin);
  designer = await cookieFor(org.db, org.actors.designer);
  stranger = await cookieFor(org.db, org.stranger("admin").actor);
});
afterAll(async () => {
  stopServing();
  await org.close();
});

const post = (over: Parameters<typeof callRoute>[1] = {}) =>
  callRoute(bays.POST, { method: "POST", cookie: admin, body: { name: `Bay ${newId()}` }, ...over });

test.each([
  ["no Origin at all", { origin: "" }],
  ["another origin", { origin: "http://evil.example" }],
  ["the right host with another port", { origin: "http://127.0.0.1:3001" }],
  ["an opaque origin", { origin: "null" }],
  ["a foreign site without Origin", { origin: "", "sec-fetch-site": "cross-site" }],
  ["a host that is not loopback", { origin: "http://rebound.example", host: "rebound.example" }],
])("a change with %s is 403 and changes nothing", async (_what, headers) => {
  const before = await everything(org.db);
  const response = await post({ headers });
  expect(response.status).toBe(403);
  expect(await everything(org.db)).toBe(before);
});

test("its own origin, or same-origin said by the browser, is let through", async () => {
  expect((await post()).status).toBe(201);
  expect((await post({ headers: { origin: "", "sec-fetch-site": "same-origin" } })).status).toBe(201);
});

test.each([
  ["another content type", { headers: { "content-type": "text/plain" } }, 415],
  ["a form", { headers: { "content-type": "application/x-www-form-urlencoded" } }, 415],
  ["broken JSON", { raw: "{" }, 400],
  ["bytes that are not UTF-8", { raw: new Uint8Array([0x22, 0xff, 0x22]) }, 400],
  ["a prototype in a key", { raw: '{"name":"x","__proto__":{"a":1}}' }, 400],
  ["an escaped prototype key", { raw: '{"name":"x","\\u005f_proto__":{"a":1}}' }, 400],
  ["an unknown field", { body: { name: "x", organisationId: "y" } }, 422],
  ["a number as text", { body: { name: "x", tolerance: "0.01" } }, 422],
  ["1e309", { raw: '{"name":"x","tolerance":1e309}' }, 422],
  ["an array", { raw: "[]" }, 422],
  ["null", { raw: "null" }, 422],
])("%s is refused", async (_what, over, status) => {
  const before = await everything(org.db);
  const response = await post(over);
  expect(response.status).toBe(status);
  expect(response.headers.get("content-type")).toBe("application/problem+json; charset=utf-8");
  expect(response.headers.get("cache-control")).toBe("no-store");
  expect(await everything(org.db)).toBe(before);
});

test("a body larger than the limit is 413, one cut short of its length 400", async () => {
  expect((await post({ raw: `{"name":"${"x".repeat(5_000_000)}"}` })).status).toBe(413);
  expect((await post({ headers: { "content-length": "999" } })).status).toBe(400);
});

test("without a session everything is 401, whatever else is wrong with the request", async () => {
  for (const cookie of ["", "flitchbook=", "flitchbook=abc", "other=1"]) {
    const response = await callRoute(bays.GET, { cookie });
    expect(response.status).toBe(401);
  }
  expect(
    (await callRoute(properties.POST, { method: "POST", raw: "{", cookie: "flitchbook=x" })).status,
  ).toBe(401);
});

test("a thing of another organisation and one that does not exist answer the same, byte for byte but the request id", async () => {
  const { id } = await makeReleased(org);
  const bodyOf = async (shapeId: string) => {
    const response = await callRoute(shape.GET, { cookie: stranger, params: { id: shapeId } });
    const headers = [...response.headers].filter(([name]) => name !== "x-request-id");
    const text = await response.text();
    return JSON.stringify([
      response.status,
      headers,
      text.replace(response.headers.get("x-request-id") ?? "", "ID"),
    ]);
  };
  expect(await bodyOf(id)).toBe(await bodyOf(newId()));
  expect(await bodyOf(id)).toContain("404");
});

test("a change without a version is 428, with a stale or made-up one 412", async () => {
  const patch = (headers: Record<string, string>) =>
    callRoute(me.PATCH, { method: "PATCH", cookie: admin, body: { name: "New name" }, headers });
  expect((await patch({})).status).toBe(428);
  expect((await patch({ "if-match": '"99"' })).status).toBe(412);
  expect((await patch({ "if-match": "*" })).status).toBe(412);
  const etag = (await callRoute(me.GET, { cookie: admin })).headers.get("etag") ?? "";
  const done = await patch({ "if-match": etag });
  expect(done.status).toBe(200);
  expect(done.headers.get("etag")).not.toBe(etag);
});

test("the admin's change of a right counts on the designer's next request with the session that is open", async () => {
  const mine = async () =>
    (await (await callRoute(me.GET, { cookie: designer })).json()) as { rights: Record<string, string> };
  expect((await mine()).rights[org.bayIds[0]]).toBe("read");
  const body = { memberId: org.actors.designer.membershipId, bayId: org.bayIds[0], right: "draft" };
  expect((await callRoute(rights.PUT, { method: "PUT", cookie: admin, body })).status).toBe(200);
  expect((await mine()).rights).toMatchObject({ [org.bayIds[0]]: "draft", [org.bayIds[1]]: "read" });
  expect((await callRoute(rights.PUT, { method: "PUT", cookie: designer, body })).status).toBe(403);
});

test("a bug answers 500 without detail, and the log keeps the cause", async () => {
  const response = await callRoute(drawing.GET, {
    cookie: admin,
    params: new Proxy(
      {},
      {
        ownKeys: () => {
          throw new Error("SELECT secret FROM /etc");
        },
      },
    ),
  });
  expect(response.status).toBe(500);
  expect(await response.text()).not.toMatch(/secret|etc|Error|at /);
});

test("properties of any drawing come back exact, and a drawing that has none names its part", async () => {
  const good = await callRoute(properties.POST, {
    method: "POST",
    cookie: designer,
    body: { drawing: rectangleDrawing(10, 120) },
  });
  expect(good.status).toBe(200);
  const { properties: values } = (await good.json()) as { properties: { Ix: number } };
  expectRel(values.Ix, (10 * 120 ** 3) / 12, { rel: 1e-12 });
  const bad = await callRoute(properties.POST, {
    method: "POST",
    cookie: designer,
    body: { drawing: { ...rectangleDrawing(10, 120), parts: [] } },
  });
  expect(bad.status).toBe(422);
  expect(((await bad.json()) as { issues: { pointer: string }[] }).issues[0]?.pointer).toBe("/drawing/parts");
});

test("every answer names its request and its own origin needs no PUBLIC_ORIGIN on loopback", async () => {
  const response = await callRoute(bays.GET, { cookie: admin });
  expect(response.headers.get("x-request-id")).toMatch(/^[0-9a-f-]{36}$/);
  expect(response.headers.get("cache-control")).toBe("no-store");
  expect(ORIGIN).toMatch(/^http:\/\/127/);
});
