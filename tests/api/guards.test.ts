import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { expectStatus, signedIn, type Client } from "@/tests/helpers/api-client";
import { DEMO_PASSWORD } from "@/tests/helpers/demo-accounts";
import { girderDrawing } from "@/tests/helpers/main-job-girder";
import { startServer, type BuiltServer } from "@/tests/helpers/server";

let server: BuiltServer;
let engineer: Client;
let admin: Client;

beforeAll(async () => {
  server = await startServer();
  engineer = await signedIn(server.url, "engineer");
  admin = await signedIn(server.url, "admin");
});
afterAll(() => server.stop());

const SAFE = {
  "x-content-type-options": "nosniff",
  "cross-origin-opener-policy": "same-origin",
  "referrer-policy": "same-origin",
} as const;

/** Address of one built script, as the sign-in page names it. */
const assetPath = async (): Promise<string> => {
  const page = await (await fetch(`${server.url}/sign-in`)).text();
  const found = /\/_next\/static\/[^"]+\.js/.exec(page);
  if (!found) throw new Error("the sign-in page names no script");
  return found[0];
};

describe("headers", () => {
  test.each([
    ["a page", async () => "/sign-in"],
    ["a page that sends away", async () => "/rack"],
    ["a page that is not there", async () => "/no-such-page"],
    ["a route", async () => "/api/health"],
    ["a refused route", async () => "/api/v1/shapes"],
    ["a route that is not there", async () => "/api/v1/no-such-route"],
    ["a built script", assetPath],
    ["the mark", async () => "/logo.svg"],
  ])("of %s keep the browser safe", async (_name, path) => {
    const answer = await fetch(server.url + (await path()), { redirect: "manual" });
    for (const [name, value] of Object.entries(SAFE)) expect(answer.headers.get(name), name).toBe(value);
    expect(answer.headers.get("content-security-policy")).toContain("frame-ancestors 'none'");
    expect(answer.headers.get("x-powered-by")).toBeNull();
  });

  test("of a page carry a nonce that is new each time and allow no other script", async () => {
    const policyOf = async () =>
      (await fetch(`${server.url}/sign-in`)).headers.get("content-security-policy") ?? "";
    const [one, two] = [await policyOf(), await policyOf()];
    const nonce = (policy: string) => /script-src[^;]*'nonce-([^']+)'/.exec(policy)?.[1];
    expect(nonce(one)).toMatch(/^.{20,}$/);
    expect(nonce(one)).not.toBe(nonce(two));
    expect(/script-src[^;]*/.exec(one)?.[0]).not.toMatch(/unsafe-inline|unsafe-eval|https?:/);
  });

  test("of what depends on a person forbid keeping it", async () => {
    for (const path of ["/api/v1/me", "/api/v1/shapes"]) {
      const answer = await fetch(server.url + path);
      expect(answer.headers.get("cache-control"), path).toContain("no-store");
    }
  });
});

describe("the origin of a change", () => {
  const signIn = (headers: Record<string, string>) =>
    fetch(`${server.url}/api/v1/session`, {
      method: "POST",
      headers: { "content-type": "application/json", ...headers },
      body: JSON.stringify({ email: "designer@harrowtide.example", password: DEMO_PASSWORD }),
    });
  test("is refused when it is missing or another, sign-in included", async () => {
    expect((await signIn({})).status).toBe(403);
    expect((await signIn({ origin: "https://elsewhere.example" })).status).toBe(403);
    expect((await signIn({ origin: "null" })).status).toBe(403);
  });
  test("is accepted when it is the server's own", async () => {
    expect((await signIn({ origin: server.url })).status).toBe(201);
  });
});

describe("problem documents", () => {
  const problem = { type: expect.any(String), title: expect.any(String), requestId: expect.any(String) };

  test.each([
    ["broken JSON", 400, { method: "POST", path: "/properties", raw: "{", type: "application/json" }],
    ["a body of another type", 415, { method: "POST", path: "/properties", raw: "x", type: "text/plain" }],
  ])("%s is %i", async (_name, status, { method, path, raw, type }) => {
    const bytes = new TextEncoder().encode(raw);
    const answer = expectStatus(await engineer.send(method, path, { raw: { bytes, type } }), status);
    expect(answer.headers.get("content-type")).toContain("application/problem+json");
    expect(answer.body).toMatchObject({ ...problem, status });
  });

  test("an unknown field is named", async () => {
    const answer = await engineer.send("POST", "/properties", {
      body: { drawing: girderDrawing(), colour: 1 },
    });
    expectStatus(answer, 422);
    expect(answer.body.issues).toMatchObject([{ pointer: "/colour" }]);
  });

  test.each([["1e309"], ["null"], ['"12"'], ['""'], ["-1"], ["0"]])(
    "a plate %s mm wide is refused with the place of the field",
    async (text) => {
      const raw = JSON.stringify({ drawing: girderDrawing() }).replace('"width":180', `"width":${text}`);
      const bytes = new TextEncoder().encode(raw);
      const answer = await engineer.send("POST", "/properties", { raw: { bytes, type: "application/json" } });
      expectStatus(answer, 422);
      expect(JSON.stringify(answer.body.issues)).toContain("/drawing/parts/0/shape/width");
    },
  );

  test("a change without a version is 428, with a stale one 412, and changes nothing", async () => {
    const { body } = await admin.get<{ items: { id: string; name: string; version: number }[] }>("/bays");
    const bay = body.items[0]!;
    const rename = { body: { name: "Renamed" } };
    expectStatus(await admin.send("PATCH", `/bays/${bay.id}`, rename), 428);
    const stale = await admin.send("PATCH", `/bays/${bay.id}`, { ...rename, ifMatch: bay.version + 7 });
    expect([409, 412]).toContain(stale.status);
    const after = await admin.get<typeof body>("/bays");
    expect(after.body.items[0]).toMatchObject({ name: bay.name, version: bay.version });
  });

  test("a thing that is not there answers alike, whatever its id looks like", async () => {
    const answers = await Promise.all(
      ["01890000-0000-7000-8000-000000000000", "x", "%27%20OR%201=1"].map((id) =>
        engineer.send("GET", `/shapes/${id}`),
      ),
    );
    const bodies = answers.map((answer) => ({ ...expectStatus(answer, 404).body, requestId: "" }));
    expect(new Set(bodies.map((body) => JSON.stringify(body))).size).toBe(1);
  });

  test("no answer shows a stack, SQL, a path or a version", async () => {
    for (const path of ["/shapes?limit=x", "/shapes?cursor=AAAA", "/shapes?sort=drop", "/shapes?minSx=NaN"]) {
      const answer = expectStatus(await engineer.get<unknown>(path), 422);
      expect(JSON.stringify(answer.body)).not.toMatch(/\bat .*\.(ts|js):|SELECT|SQLITE|node_modules|\/lib\//);
    }
  });
});
