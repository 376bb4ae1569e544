import "server-only";
import { lte } from "drizzle-orm";
import { database, type Db } from "@/db/client";
import { databaseRefusal, prepareDatabase } from "@/db/prepare";
import { attempts } from "@/db/schema/attempts";
import { verifyPassword } from "@/lib/auth/password";
import { sweepSessions } from "@/lib/auth/sessions";
import type { Drawing } from "@/lib/drawing/schema";
import { environment } from "@/lib/env";
import { logger } from "@/lib/logger";
import { keepSendingLetters } from "@/lib/mail/send-letters";
import { computePool } from "@/lib/services/compute/pool";
import { startJobs } from "@/lib/services/delivery/run-jobs";

const SWEEP_EVERY_MS = 3_600_000;

/** A plate to warm the compute threads up with. */
const PLATE: Drawing = {
  version: 1,
  unit: "mm",
  reference: "m",
  materials: [{ id: "m", name: "Steel", E: 210_000, G: 81_000, fy: 355, density: 7850 }],
  parts: [
    {
      id: "p",
      name: "Plate",
      material: "m",
      at: { x: 0, y: 0 },
      angle: 0,
      shape: { kind: "plate", width: 10, height: 100 },
    },
  ],
  joints: [],
};

const refuse = (line: string): never => {
  process.stderr.write(`${line}\n`);
  process.exit(1);
};

const sweep = async (db: Db): Promise<void> => {
  await sweepSessions(db);
  await db.write((tx) => tx.delete(attempts).where(lte(attempts.expiresAt, Date.now())));
};

const openDatabase = async (): Promise<Db> => {
  const { DATABASE_URL } = environment();
  try {
    const db = await database();
    await prepareDatabase(db);
    return db;
  } catch (error) {
    return refuse(databaseRefusal(error, DATABASE_URL));
  }
};

/**
 * What the server does before its first request: reads the environment, opens, checks and migrates the database, warms
 * the compute threads and the password hash up, takes up deliveries that a crash left in the middle, and sweeps what ran out, now and every hour. What fails ends the
 * process with one line and exit code 1: a server that answers 500 to everybody helps nobody.
 */
export const startUp = async (): Promise<void> => {
  try {
    environment();
  } catch (error) {
    refuse(error instanceof Error ? error.message : String(error));
  }
  const db = await openDatabase();
  await computePool().warmUp(PLATE);
  await verifyPassword(null, "warm-up");
  await startJobs(db, { atStart: true });
  const sweepQuietly = () =>
    void sweep(db).catch((error: unknown) => logger().warn({ err: String(error) }, "sweeping failed"));
  sweepQuietly();
  setInterval(sweepQuietly, SWEEP_EVERY_MS).unref();
  keepSendingLetters(db);
};
