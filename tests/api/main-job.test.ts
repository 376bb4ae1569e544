import { readFileSync } from "node:fs";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import type { BayList } from "@/lib/schemas/bay";
import type { Delivery, RowPage } from "@/lib/schemas/delivery";
import type { MemberList } from "@/lib/schemas/member";
import type { Properties } from "@/lib/schemas/properties";
import type { Me } from "@/lib/schemas/session";
import type { RevisionRecord, ShapeSheet } from "@/lib/schemas/shape";
import { clientOf, expectStatus, signedIn, type Client } from "@/tests/helpers/api-client";
import { expectRel } from "@/tests/helpers/expect-rel";
import { girderDrawing, GIRDER_FIGURES } from "@/tests/helpers/main-job-girder";
import { startServer, type BuiltServer } from "@/tests/helpers/server";
import { ROOT } from "@/tests/helpers/source-files";

let server: BuiltServer;
let engineer: Client;
let librarian: Client;
let designer: Client;
let admin: Client;
let bays: Record<string, string>;

beforeAll(async () => {
  server = await startServer();
  engineer = await signedIn(server.url, "engineer");
  librarian = await signedIn(server.url, "librarian");
  designer = await signedIn(server.url, "designer");
  admin = await signedIn(server.url, "admin");
  const { body } = await engineer.get<BayList>("/bays");
  bays = Object.fromEntries(body.items.map(({ name, id }) => [name, id]));
});
afterAll(() => server.stop());

const DESIGNATION = "PG 0500-9";
const EXACT = { rel: 1e-12 };
type FoundPage = {
  items: { id: string; designation: string; mass: number; Sx: number; Ix: number }[];
  next: string | null;
};

/** Waits for a delivery's job: asks again until it is in the state, 20 s at most. */
const until = async (id: string, state: Delivery["state"]) => {
  for (let tries = 0; tries < 200; tries += 1) {
    const answer = await librarian.get<Delivery>(`/deliveries/${id}`);
    if (answer.body.state === state) return answer;
    expect(["received", "reading", "putting-away"], JSON.stringify(answer.body.fault)).toContain(
      answer.body.state,
    );
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error(`the delivery never came to ${state}`);
};

describe("the main job over /api/v1", () => {
  let girder: ShapeSheet;

  test("the engineer's girder is computed exactly, kept as a draft and submitted", async () => {
    const drawing = girderDrawing();
    const figures = expectStatus(
      await engineer.send<{ properties: Properties }>("POST", "/properties", { body: { drawing } }),
      200,
    ).body;
    for (const [key, value] of Object.entries(GIRDER_FIGURES))
      expectRel(figures.properties[key as keyof typeof GIRDER_FIGURES], value, { ...EXACT, name: key });

    const draft = expectStatus(
      await engineer.send<ShapeSheet>("POST", "/shapes", {
        body: { bayId: bays["Plate girders"], family: "plate-girder", designation: DESIGNATION, drawing },
      }),
      201,
    );
    girder = draft.body;
    expectRel(girder.revision.computed.Ix, GIRDER_FIGURES.Ix, EXACT);
    expect(girder.revision).toMatchObject({ state: "draft", letter: "A" });
    expectStatus(await designer.get(`/shapes/${girder.id}`), 404);

    const submitted = await engineer.send<RevisionRecord>("POST", `/shapes/${girder.id}/revisions/1/submit`, {
      ifMatch: girder.revision.version,
    });
    expect(expectStatus(submitted, 200).body.state).toBe("submitted");
  });

  test("the librarian's stock arrives as the raw file, is compared row by row and put away in one transaction", async () => {
    const bytes = new Uint8Array(readFileSync(join(ROOT, "fixtures/csv/stock-eu.csv")));
    const announced = expectStatus(
      await librarian.send<Delivery>("POST", "/deliveries", {
        body: { bayId: bays["Rolled beams"], fileName: "stock-eu.csv" },
      }),
      201,
    );
    const { id } = announced.body;
    const put = await librarian.send<Delivery>("PUT", `/deliveries/${id}/file`, {
      raw: { bytes, type: "text/csv" },
      ifMatch: announced.etag,
    });
    expect([200, 202]).toContain(put.status);

    const read = await until(id, "read");
    const { counts } = read.body;
    if (!counts) throw new Error("a read delivery has counts");
    const rows = readFileSync(join(ROOT, "fixtures/csv/stock-eu.csv"), "utf8").trim().split("\n").length - 1;
    expect(counts.rows).toBe(rows);
    expect(counts.accepted + counts.queried + counts.refused).toBe(rows);
    expect(counts.accepted).toBeGreaterThan(rows / 2);
    const unsettled = await librarian.get<RowPage>(`/deliveries/${id}/rows?open=yes&limit=200`);
    for (const row of unsettled.body.items) expect(row.reasons, row.designation).not.toEqual([]);

    const before = await designer.get<FoundPage>("/shapes?q=IPE&limit=200");
    expect(before.body.items).toEqual([]);
    expectStatus(
      await librarian.send("POST", `/deliveries/${id}/put-away`, {
        body: { leaveOutUndecided: true },
        ifMatch: read.etag,
      }),
      200,
    );
    await until(id, "put-away");
    const after = await designer.get<FoundPage>("/shapes?q=IPE&limit=200");
    expect(after.body.items.map((item) => item.designation)).toContain("IPE 300");
  });

  test("the girder is checked by somebody else and released by the librarian", async () => {
    const path = `/shapes/${girder.id}/revisions/1`;
    const shown = await librarian.get<RevisionRecord>(path);
    const early = await librarian.send("POST", `${path}/release`, { ifMatch: shown.etag });
    expectStatus(early, 409);
    const checked = expectStatus(
      await admin.send<RevisionRecord>("POST", `${path}/check`, {
        body: { how: "hand check" },
        ifMatch: shown.etag,
      }),
      200,
    );
    const released = await librarian.send<RevisionRecord>("POST", `${path}/release`, {
      ifMatch: checked.etag,
    });
    expect(expectStatus(released, 200).body.state).toBe("released");
  });

  test("the designer finds the lightest first, girder and rolled beams together, and opens the shape by its address", async () => {
    const [minSx, minIx] = [1.3e6, 3e8];
    const { body } = expectStatus(
      await designer.get<FoundPage>(`/shapes?minSx=${minSx}&minIx=${minIx}&sort=mass&limit=200`),
      200,
    );
    expect(body.next).toBeNull();
    const names = body.items.map((item) => item.designation);
    expect(names).toContain(DESIGNATION);
    expect(names.some((name) => name.startsWith("IPE"))).toBe(true);
    for (const item of body.items) {
      expect(item.Sx).toBeGreaterThanOrEqual(minSx);
      expect(item.Ix).toBeGreaterThanOrEqual(minIx);
    }
    const masses = body.items.map((item) => item.mass);
    expect(masses).toEqual([...masses].sort((a, b) => a - b));

    const all = await designer.get<FoundPage>("/shapes?limit=200");
    const missed = all.body.items.filter(
      (item) => item.Sx >= minSx && item.Ix >= minIx && !names.includes(item.designation),
    );
    expect(missed).toEqual([]);

    const sheet = expectStatus(await designer.get<ShapeSheet>(`/shapes/${girder.id}`), 200).body;
    expectRel(sheet.revision.computed.Sx, GIRDER_FIGURES.Sx, EXACT);
    expect(sheet.revision.checked?.by.name).toBe("J. Harrow");
  });

  test("a right that the admin raises counts on the designer's next request", async () => {
    const draft = {
      bayId: bays["Crane girders"],
      family: "plate-girder",
      designation: "CG 0500-T",
      drawing: girderDrawing(),
    };
    expectStatus(await designer.send("POST", "/shapes", { body: draft }), 403);
    const me = (await designer.get<Me>("/me")).body;
    const members = (await admin.get<MemberList>("/members")).body.items;
    const member = members.find(({ userId }) => userId === me.user.id)!;
    expectStatus(
      await admin.send("PUT", "/rights", {
        body: { memberId: member.id, bayId: bays["Crane girders"], right: "draft" },
      }),
      200,
    );
    expectStatus(await designer.send("POST", "/shapes", { body: draft }), 201);
    expectStatus(await designer.send("POST", "/shapes", { body: { ...draft, bayId: bays["Boxes"] } }), 403);
  });

  test("the log tells all of it", async () => {
    const { body } = await admin.get<{ items: { verb: string; subject: string }[] }>("/log?limit=200");
    const told = body.items.map(({ verb }) => verb);
    for (const verb of [
      "shape.create",
      "revision.submit",
      "delivery.putAway",
      "revision.check",
      "revision.release",
      "right.put",
    ])
      expect(told).toContain(verb);
    expectStatus(await designer.get("/log"), 403);
  });

  test("nobody signed in gets nothing", async () => {
    for (const path of ["/shapes", "/bays", "/members", "/log", `/shapes/${girder.id}`])
      expectStatus(await clientOf(server.url).get(path), 401);
  });
});
