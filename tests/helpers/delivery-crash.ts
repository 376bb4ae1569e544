import { spawn } from "node:child_process";
import { copyFileSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { setTimeout } from "node:timers/promises";
import { createClient } from "@libsql/client";
import { eq } from "drizzle-orm";
import { deliveries } from "@/db/schema/deliveries";
import { createDelivery } from "@/lib/services/delivery/create";
import { addJob } from "@/lib/services/delivery/job";
import { putDeliveryFile } from "@/lib/services/delivery/put-file";
import { jobsAtRest } from "@/lib/services/delivery/run-jobs";
import { showDelivery } from "@/lib/services/delivery/show";
import { ROOT } from "@/tests/helpers/source-files";
import { testOrganisation } from "@/tests/helpers/test-organisation";

export const CRASH_ROWS = 325;

/** A table of many rows: the stock table over and over, each row under a designation of its own. */
export const longTable = (rows: number): Uint8Array<ArrayBuffer> => {
  const [head = "", ...lines] = readFileSync(join(ROOT, "fixtures/csv/stock-eu.csv"), "utf8")
    .trim()
    .split("\n");
  const made = Array.from({ length: rows }, (_, i) =>
    (lines[i % lines.length] ?? "").replace(/^([^;]*)/, `$1 no ${i + 1}`),
  );
  return new TextEncoder().encode([head, ...made].join("\n"));
};

/** A database file with a delivery that has been read and whose putting away has been asked for, but not begun. */
export async function crashTemplate(): Promise<string> {
  const org = await testOrganisation();
  const ctx = org.as("librarian");
  const made = await createDelivery({ ctx, input: { bayId: org.bayIds[1], fileName: "long.csv" } });
  await putDeliveryFile({ ctx, deliveryId: made.id, version: made.version, bytes: longTable(CRASH_ROWS) });
  await jobsAtRest();
  const read = await showDelivery({ ctx, deliveryId: made.id });
  if (read.counts?.accepted !== CRASH_ROWS)
    throw new Error(`the table was not read: ${JSON.stringify(read.fault ?? read.counts)}`);
  await org.db.write(async (tx) => {
    await tx.update(deliveries).set({ state: "putting-away" }).where(eq(deliveries.id, made.id));
    await addJob(tx, {
      kind: "delivery.putAway",
      deliveryId: made.id,
      actor: ctx.actor,
      requestId: "crash",
      now: Date.now(),
    });
  });
  const file = join(mkdtempSync(join(tmpdir(), "flitchbook-crash-")), "template.db");
  await org.db.writer.execute(`VACUUM INTO '${file}'`);
  await org.close();
  return file;
}

const startJobsOf = (file: string) =>
  spawn(
    process.execPath,
    ["--conditions=react-server", "--import", "tsx", join(ROOT, "tests/helpers/do-jobs.ts"), file],
    {
      cwd: ROOT,
      env: { ...process.env, NEXT_RUNTIME: "" },
      stdio: ["ignore", "pipe", "inherit"],
    },
  );

type After = Readonly<{
  shapes: number;
  revisions: number;
  figures: number;
  finder: number;
  logged: number;
  state: string;
  damage: string;
}>;

/** What stands in a database file. */
export async function standing(file: string): Promise<After> {
  const client = createClient({ url: `file:${file}` });
  const one = async (sql: string) => (await client.execute(sql)).rows[0]?.[0];
  const count = async (table: string, where = "1") =>
    Number(await one(`SELECT count(*) FROM ${table} WHERE ${where}`));
  const after = {
    shapes: await count("shapes"),
    revisions: await count("revisions"),
    figures: await count("figures"),
    finder: await count("finder"),
    logged: await count("log", "verb = 'delivery.putAway'"),
    state: String(await one("SELECT state FROM deliveries")),
    damage: String(await one("PRAGMA integrity_check")),
  };
  client.close();
  return after;
}

/** Begins to put away on a copy of the template and kills the process after `waitMs`; answers the file. */
export async function killedAfter(template: string, waitMs: number): Promise<string> {
  const file = template.replace("template.db", `killed-${waitMs}-${process.hrtime.bigint()}.db`);
  copyFileSync(template, file);
  const child = startJobsOf(file);
  const ended = new Promise<void>((resolve) => child.once("close", () => resolve()));
  await new Promise<void>((resolve) => child.stdout.once("data", () => resolve()));
  await setTimeout(waitMs);
  child.kill("SIGKILL");
  await ended;
  return file;
}

/** Runs the jobs of a file to their end, as the next start of the server does. */
export async function finished(file: string): Promise<void> {
  const child = startJobsOf(file);
  const code = await new Promise<number | null>((resolve) => child.once("close", resolve));
  if (code !== 0) throw new Error(`the jobs ended with ${code}`);
}

export const forget = (file: string): void => {
  for (const end of ["", "-wal", "-shm"]) rmSync(file + end, { force: true });
};
