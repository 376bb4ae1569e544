import { readFileSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import type { Ctx } from "@/lib/services/context";
import { createDelivery } from "@/lib/services/delivery/create";
import { decideRow } from "@/lib/services/delivery/decide";
import { deleteDelivery } from "@/lib/services/delivery/delete";
import { exportQueries } from "@/lib/services/delivery/export-queries";
import { listDeliveries } from "@/lib/services/delivery/list";
import { putAway } from "@/lib/services/delivery/put-away";
import { putDeliveryFile } from "@/lib/services/delivery/put-file";
import { putReading } from "@/lib/services/delivery/put-reading";
import { returnDelivery } from "@/lib/services/delivery/return";
import { findDeliveryRows, showDeliveryRow } from "@/lib/services/delivery/rows";
import { jobsAtRest } from "@/lib/services/delivery/run-jobs";
import { showDelivery } from "@/lib/services/delivery/show";
import { exportShapes } from "@/lib/services/shape/export";
import { expectRel } from "@/tests/helpers/expect-rel";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(async () => {
  await jobsAtRest();
  await org.close();
});

const file = (name: string) => new Uint8Array(readFileSync(`fixtures/csv/${name}.csv`));
const text = (s: string) => new TextEncoder().encode(s);
const count = async (sql: string, args: string[] = []) =>
  Number((await org.db.reader.execute({ sql, args })).rows[0]?.[0]);
const librarian = () => org.as("librarian");

async function bring(ctx: Ctx, bytes: Uint8Array, fileName = "table.csv", bayId: string = org.bayIds[1]) {
  const made = await createDelivery({ ctx, input: { bayId, fileName } });
  await putDeliveryFile({ ctx, deliveryId: made.id, version: made.version, bytes });
  await jobsAtRest();
  return showDelivery({ ctx, deliveryId: made.id });
}
const away = async (id: string, input = {}) => {
  const { version } = await showDelivery({ ctx: librarian(), deliveryId: id });
  return putAway({ ctx: librarian(), deliveryId: id, version, input });
};

describe("the European table", () => {
  test("is read in a thread, put away in one transaction, and every shape is released and found", async () => {
    const read = await bring(librarian(), file("stock-eu"), "stock-eu.csv");
    expect(read).toMatchObject({
      state: "read",
      code: "D-0001",
      counts: { rows: 65, accepted: 65, undecided: 0, new: 65 },
    });
    const put = await away(read.id);
    expect(put).toMatchObject({ state: "put-away", counts: { rows: 65, new: 65 } });
    const args = [org.organisationId];
    expect(
      await count("SELECT count(*) FROM finder WHERE organisation_id = ? AND state = 'released'", args),
    ).toBe(65);
    expect(
      await count("SELECT count(*) FROM figures WHERE organisation_id = ? AND source = 'tabulated'", args),
    ).toBe(65);
    expect(
      await count(
        "SELECT count(*) FROM revisions WHERE organisation_id = ? AND checked_how = 'computation'",
        args,
      ),
    ).toBe(65);
    const [ipe] = (
      await org.db.reader.execute({
        sql: "SELECT Ix, squash FROM figures f JOIN revisions r ON r.id = f.revision_id JOIN shapes s ON s.id = r.shape_id WHERE s.organisation_id = ? AND s.designation = 'IPE 300' AND f.source = 'computed'",
        args,
      })
    ).rows;
    // EN 10365, IPE 300: Iy 8356 cm⁴ printed with four digits.
    expectRel(Number(ipe?.Ix), 8356e4, { rel: 2e-4 });
    expect(ipe?.squash).toBeNull();
    expect(
      await count("SELECT count(*) FROM log WHERE organisation_id = ? AND verb = 'delivery.putAway'", args),
    ).toBe(1);
  });

  test("the same file twice doubles nothing: every row is unchanged", async () => {
    const again = await bring(librarian(), file("stock-eu"), "stock-eu.csv");
    expect(again.counts).toMatchObject({ unchanged: 65, new: 0, changed: 0 });
    expect(again.sameFile).toMatchObject([{ code: "D-0001", state: "put-away" }]);
    await away(again.id);
    expect(
      await count("SELECT count(*) FROM revisions WHERE organisation_id = ?", [org.organisationId]),
    ).toBe(65);
  });

  test("our own export is taken back unchanged", async () => {
    const pieces = await exportShapes({ ctx: librarian(), input: {}, format: "csv" });
    let csv = "";
    for await (const piece of pieces) csv += piece;
    const back = await bring(librarian(), text(csv), "export.csv");
    expect(back.recognised?.questions).toEqual([]);
    expect(back.counts).toMatchObject({ rows: 65, accepted: 65, unchanged: 65, changed: 0 });
  });

  test("putting away twice is a conflict, also when both press at once", async () => {
    const two = await bring(
      librarian(),
      text(
        "Bezeichnung;Reihe;h [mm];b [mm];tw [mm];tf [mm];r [mm];A [cm²]\nIPE 199;IPE;200;100;5,6;8,5;12;28,48\n",
      ),
    );
    const both = await Promise.allSettled([
      putAway({ ctx: librarian(), deliveryId: two.id, version: two.version, input: {} }),
      putAway({ ctx: librarian(), deliveryId: two.id, version: two.version, input: {} }),
    ]);
    expect(both.map((b) => b.status).sort()).toEqual(["fulfilled", "rejected"]);
    await expect(away(two.id)).rejects.toMatchObject({ code: "conflict" });
    expect(await count("SELECT count(*) FROM shapes WHERE designation = 'IPE 199'")).toBe(1);
  });

  test("a changed table makes further revisions, and returning the delivery gives the earlier ones back", async () => {
    const changed = new TextDecoder()
      .decode(file("stock-eu"))
      .replace("IPE 200;IPE;22,4;", "IPE 200;IPE;22,5;");
    const read = await bring(librarian(), text(changed));
    expect(read.counts).toMatchObject({ changed: 1, unchanged: 64, new: 0 });
    const put = await away(read.id);
    const of = async () =>
      (
        await org.db.reader.execute({
          sql: "SELECT r.ordinal, r.state FROM revisions r JOIN shapes s ON s.id = r.shape_id WHERE s.designation = 'IPE 200' AND s.organisation_id = ? ORDER BY 1",
          args: [org.organisationId],
        })
      ).rows.map((r) => r.state);
    expect(await of()).toEqual(["superseded", "released"]);
    await returnDelivery({
      ctx: librarian(),
      deliveryId: put.id,
      version: put.version,
      input: { reason: "Wrong edition" },
    });
    expect(await of()).toEqual(["released", "withdrawn"]);
    expect(
      await count("SELECT ordinal FROM finder WHERE designation = 'IPE 200' AND organisation_id = ?", [
        org.organisationId,
      ]),
    ).toBe(1);
  });

  test("a delivery something was built on is not returned, and says on what", async () => {
    const read = await bring(
      librarian(),
      text(
        "Bezeichnung;Reihe;h [mm];b [mm];tw [mm];tf [mm];r [mm];A [cm²]\nIPE 198;IPE;200;100;5,6;8,5;12;28,48\n",
      ),
    );
    const put = await away(read.id);
    const row = await showDeliveryRow({ ctx: librarian(), deliveryId: put.id, row: 1 });
    await org.db.write(async (tx) => {
      await tx.raw.execute({
        sql: "INSERT INTO takes (id, organisation_id, shape_id, ordinal, job_number, quantity, taken_by, created_at) VALUES ('t1', ?, ?, 1, 'J-17', 2, ?, 1)",
        args: [org.organisationId, row.shapeId ?? "", org.actors.engineer.userId],
      });
    });
    await expect(
      returnDelivery({ ctx: librarian(), deliveryId: put.id, version: put.version, input: { reason: "x" } }),
    ).rejects.toMatchObject({
      code: "conflict",
      issues: [{ detail: expect.stringContaining("J-17") }],
    });
  });
});

describe("the table with planted defects", () => {
  test("is decided row by row, mended, and put away with what is kept", async () => {
    const ctx = librarian();
    const fresh = await testOrganisation();
    const own: Ctx = fresh.as("librarian");
    const made = await createDelivery({ ctx: own, input: { bayId: fresh.bayIds[1], fileName: "bad.csv" } });
    await putDeliveryFile({
      ctx: own,
      deliveryId: made.id,
      version: made.version,
      bytes: file("stock-eu-bad"),
    });
    await jobsAtRest();
    const id = made.id;
    const read = await showDelivery({ ctx: own, deliveryId: id });
    expect(read.counts).toMatchObject({ rows: 12, queried: 7, refused: 5, undecided: 12 });
    await expect(
      putAway({ ctx: own, deliveryId: id, version: read.version, input: {} }),
    ).rejects.toMatchObject({
      code: "conflict",
      issues: expect.arrayContaining([expect.objectContaining({ code: "row.digits-swapped" })]),
    });

    const row = (n: number) => showDeliveryRow({ ctx: own, deliveryId: id, row: n });
    const decide = async (n: number, input: Parameters<typeof decideRow>[0]["input"]) =>
      decideRow({ ctx: own, deliveryId: id, row: n, version: (await row(n)).version, input });

    await expect(decide(1, { decision: "tabulated" })).rejects.toMatchObject({
      code: "invalid",
      issues: [{ pointer: "/reason" }],
    });
    await decide(1, { decision: "leave-out" });
    expect((await row(4)).verdict).toBe("accepted");
    await decide(1, { decision: null });
    expect((await row(4)).cause).toBe("duplicate");
    await decide(1, { decision: "leave-out" });
    await expect(decide(10, { decision: "computed" })).rejects.toMatchObject({ code: "invalid" });

    const mended = await decide(6, { mend: { column: 6, value: "7,1" } });
    expect(mended.row).toMatchObject({
      verdict: "accepted",
      mends: [{ column: 6, before: "-7,1", after: "7,1", by: "Test librarian" }],
    });
    expect(mended.counts).toMatchObject({ accepted: 2 });
    await decide(2, { decision: "computed" });
    await decide(3, { decision: "tabulated", reason: "The mill prints no A for this one." });
    await expect(
      decideRow({ ctx: own, deliveryId: id, row: 5, version: 99, input: { decision: "leave-out" } }),
    ).rejects.toMatchObject({ code: "stale" });

    const csv: string[] = [];
    for await (const piece of (await exportQueries({ ctx: own, deliveryId: id })).pieces) csv.push(piece);
    expect(csv.join("")).toContain("'=SUM(A1:A3)");
    expect(csv.join("")).toContain("digits swapped");

    const again = await putReading({
      ctx: own,
      deliveryId: id,
      version: (await showDelivery({ ctx: own, deliveryId: id })).version,
      input: { reading: { ...(read.recognised?.reading ?? never()), tolerance: 0.02 } },
    });
    expect(again.state).toBe("received");
    await jobsAtRest();
    expect((await row(6)).verdict).toBe("accepted");

    const put = await putAway({
      ctx: own,
      deliveryId: id,
      version: (await showDelivery({ ctx: own, deliveryId: id })).version,
      input: { leaveOutUndecided: true },
    });
    expect(put).toMatchObject({ state: "put-away", counts: { leftOut: 11 } });
    expect(Number((await fresh.db.reader.execute("SELECT count(*) FROM shapes")).rows[0]?.[0])).toBe(1);
    expect(ctx.actor.role).toBe("librarian");
    await fresh.close();
  });
});

describe("files that cannot be read", () => {
  test("are given back with line and column, and another may take their place", async () => {
    const failed = await bring(librarian(), new Uint8Array([0x61, 0x3b, 0x62, 0x0a, 0xe4, 0x3b, 0x31]));
    expect(failed).toMatchObject({
      state: "failed",
      fault: { code: "encoding.confirm", line: 2, column: 1 },
    });
    await expect(
      putDeliveryFile({
        ctx: librarian(),
        deliveryId: failed.id,
        version: failed.version,
        bytes: new Uint8Array(),
      }),
    ).rejects.toMatchObject({ code: "unreadable" });
    await putDeliveryFile({
      ctx: librarian(),
      deliveryId: failed.id,
      version: failed.version,
      bytes: file("stock-us"),
    });
    await jobsAtRest();
    const read = await showDelivery({ ctx: librarian(), deliveryId: failed.id });
    expect(read).toMatchObject({
      state: "read",
      counts: { rows: 42, refused: 0, queried: 12, byCause: { convention: 12 } },
    });
    const one = await findDeliveryRows({
      ctx: librarian(),
      deliveryId: failed.id,
      input: { cause: "convention", limit: "5" },
    });
    expect(one.items).toHaveLength(5);
    const rest = await findDeliveryRows({
      ctx: librarian(),
      deliveryId: failed.id,
      input: { cause: "convention", cursor: one.next ?? "" },
    });
    expect(rest.items).toHaveLength(7);
    const decided = await decideRow({
      ctx: librarian(),
      deliveryId: failed.id,
      row: one.items[0]?.number ?? 0,
      version: 1,
      input: { decision: "tabulated", reason: "US table", alike: true },
    });
    expect(decided).toMatchObject({ changed: 12, counts: { undecided: 0 } });
  });
});

describe("who may", () => {
  test("a designer may not, a stranger finds nothing, and nothing changes", async () => {
    const made = await createDelivery({
      ctx: librarian(),
      input: { bayId: org.bayIds[1], fileName: "x.csv" },
    });
    for (const role of ["designer", "engineer"] as const) {
      await expect(
        createDelivery({ ctx: org.as(role), input: { bayId: org.bayIds[1], fileName: "x.csv" } }),
      ).rejects.toMatchObject({ code: "forbidden" });
      await expect(showDelivery({ ctx: org.as(role), deliveryId: made.id })).rejects.toMatchObject({
        code: "forbidden",
      });
    }
    const stranger = org.stranger("librarian");
    const tries = [
      showDelivery({ ctx: stranger, deliveryId: made.id }),
      putDeliveryFile({ ctx: stranger, deliveryId: made.id, version: 1, bytes: text("a;b") }),
      findDeliveryRows({ ctx: stranger, deliveryId: made.id, input: {} }),
      decideRow({ ctx: stranger, deliveryId: made.id, row: 1, version: 1, input: { decision: "leave-out" } }),
      putAway({ ctx: stranger, deliveryId: made.id, version: 1, input: {} }),
      returnDelivery({ ctx: stranger, deliveryId: made.id, version: 1, input: { reason: "x" } }),
      deleteDelivery({ ctx: stranger, deliveryId: made.id, version: 1 }),
      createDelivery({ ctx: stranger, input: { bayId: org.bayIds[1], fileName: "x.csv" } }),
    ];
    for (const one of await Promise.allSettled(tries))
      expect(one).toMatchObject({ status: "rejected", reason: { code: "notFound" } });
    expect(await showDelivery({ ctx: librarian(), deliveryId: made.id })).toMatchObject({
      state: "announced",
      version: 1,
    });
    await expect(
      createDelivery({
        ctx: org.as("librarian", { [org.bayIds[1]]: "read" }),
        input: { bayId: org.bayIds[1], fileName: "x.csv" },
      }),
    ).rejects.toMatchObject({ code: "forbidden" });
    await deleteDelivery({ ctx: librarian(), deliveryId: made.id, version: 1 });
    expect((await listDeliveries({ ctx: librarian(), input: {} })).items.some((d) => d.id === made.id)).toBe(
      false,
    );
  });
});

function never(): never {
  throw new Error("the delivery was not read");
}
