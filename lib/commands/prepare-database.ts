import { renameSync, rmSync } from "node:fs";
import { filePathOf, openDb } from "@/db/client";
import { migrateDatabase } from "@/db/migrate";
import { seedDemo } from "@/lib/demo/seed";
import { environment, isDemo } from "@/lib/env";
import { closeComputePool } from "@/lib/services/compute/pool";
import { guarded, withDatabase } from "./command";
import { organisationCount } from "./create-organisation";

/** Fills a file beside the wanted one and moves it there whole: a seeding that breaks off leaves nothing half done. */
const seedWhole = async (path: string): Promise<void> => {
  const beside = `${path}.seed-${process.pid}`;
  try {
    const db = await openDb(`file:${beside}`);
    try {
      await migrateDatabase(db.writer);
      await seedDemo(db);
    } finally {
      await db.close();
    }
    renameSync(beside, path);
  } finally {
    for (const ending of ["", "-wal", "-shm"]) rmSync(beside + ending, { force: true });
  }
};

/** Whole, ours, migrated; answers whether the demo has still to be put into it. */
const migrateConfigured = async (): Promise<boolean> => {
  let empty = false;
  await withDatabase(async (db) => {
    empty = (await organisationCount(db)) === 0;
  });
  return empty && isDemo();
};

void guarded(async () => {
  try {
    if (!(await migrateConfigured())) return;
    const path = filePathOf(environment().DATABASE_URL);
    await (path === null ? withDatabase(seedDemo) : seedWhole(path));
  } finally {
    await closeComputePool();
  }
});
