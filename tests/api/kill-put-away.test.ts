import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import type { BayList } from "@/lib/schemas/bay";
import type { Delivery } from "@/lib/schemas/delivery";
import { expectStatus, signedIn } from "@/tests/helpers/api-client";
import { startServer } from "@/tests/helpers/server";
import { ROOT } from "@/tests/helpers/source-files";
import { copyTemplate } from "@/tests/helpers/template";

let folder: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "flitchbook-kill-"));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const STOCK = new Uint8Array(readFileSync(join(ROOT, "fixtures/csv/stock-eu.csv")));
/** All 65 rows of the table are accepted; these are the ones that are easy to find again. */
const IPE_ROWS = new TextDecoder()
  .decode(STOCK)
  .split("\n")
  .filter((line) => line.startsWith("IPE ")).length;

/** Takes the stock in up to the put-away, which is sent and not waited for. */
const unload = async (url: string): Promise<{ id: string; sent: Promise<unknown> }> => {
  const librarian = await signedIn(url, "librarian");
  const { body: bays } = await librarian.get<BayList>("/bays");
  const bay = bays.items.find(({ name }) => name === "Rolled beams")!;
  const announced = await librarian.send<Delivery>("POST", "/deliveries", {
    body: { bayId: bay.id, fileName: "stock-eu.csv" },
  });
  const { id } = expectStatus(announced, 201).body;
  await librarian.send("PUT", `/deliveries/${id}/file`, {
    raw: { bytes: STOCK, type: "text/csv" },
    ifMatch: announced.etag,
  });
  let etag = "";
  await expect
    .poll(
      async () => {
        const answer = await librarian.get<Delivery>(`/deliveries/${id}`);
        etag = answer.etag;
        return answer.body.state;
      },
      { timeout: 30_000 },
    )
    .toBe("read");
  const body = { leaveOutUndecided: true };
  const sent = librarian
    .send("POST", `/deliveries/${id}/put-away`, { body, ifMatch: etag })
    .then((answer) => answer.status)
    .catch(() => null);
  return { id, sent };
};

test.each([0, 15, 40, 90, 200])(
  "kill -9 %i ms into a put-away leaves all of it or nothing, and the next start needs no repair",
  async (delayMs) => {
    const database = join(folder, `kill-${delayMs}.db`);
    copyTemplate(database);
    const server = await startServer({ database });
    const { id, sent } = await unload(server.url);
    await new Promise((resolve) => setTimeout(resolve, delayMs));
    await server.stop("SIGKILL");
    const acknowledged = (await sent) === 200;

    const again = await startServer({ database });
    const librarian = await signedIn(again.url, "librarian");
    const found = await librarian.get<{ items: { designation: string }[] }>("/shapes?q=IPE&limit=200");
    const away = found.body.items.filter(({ designation }) => designation.startsWith("IPE ")).length;
    const delivery = (await librarian.get<Delivery>(`/deliveries/${id}`)).body;
    const admin = await signedIn(again.url, "admin");
    const log = await admin.get<{ items: { entityId: string }[] }>("/log?verb=delivery.putAway&limit=200");
    const told = log.body.items.some((entry) => entry.entityId === id);
    expect([0, IPE_ROWS]).toContain(away);
    expect(told).toBe(away > 0);
    if (acknowledged) expect(away).toBe(IPE_ROWS);
    if (delivery.state === "put-away") expect(away).toBe(IPE_ROWS);
    await again.stop();
  },
);
