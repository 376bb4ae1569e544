import { createHash } from "node:crypto";
import { copyFileSync, existsSync, mkdirSync, mkdtempSync, readFileSync, renameSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createClient } from "@libsql/client";
import { onTestFinished } from "vitest";
import { openDb, setPragmas, type Db } from "@/db/client";
import { migrateDatabase, MIGRATIONS } from "@/db/migrate";
import { bays } from "@/db/schema/bays";
import { memberships } from "@/db/schema/memberships";
import { organisations } from "@/db/schema/organisations";
import { users } from "@/db/schema/users";
import { ROLES, type Actor, type Role } from "@/lib/schemas/access";
import type { Ctx } from "@/lib/services/context";
import { newId } from "@/lib/services/new-id";

const NOW = Date.UTC(2026, 2, 12, 9, 0, 0);

/** One migrated file for each state of the migrations, made by whoever comes first and then only copied. */
const template = async (): Promise<string> => {
  const hash = createHash("sha256").update(readFileSync(join(MIGRATIONS, "meta", "_journal.json")));
  const journal = JSON.parse(readFileSync(join(MIGRATIONS, "meta", "_journal.json"), "utf8")) as {
    entries: { tag: string }[];
  };
  for (const { tag } of journal.entries) hash.update(readFileSync(join(MIGRATIONS, `${tag}.sql`)));
  const folder = join(tmpdir(), "flitchbook-test-templates");
  const path = join(folder, `${hash.digest("hex").slice(0, 16)}.db`);
  if (existsSync(path)) return path;
  mkdirSync(folder, { recursive: true });
  const fresh = join(mkdtempSync(join(folder, "new-")), "template.db");
  const client = createClient({ url: `file:${fresh}`, concurrency: 1 });
  await setPragmas(client);
  await migrateDatabase(client);
  await client.execute("PRAGMA wal_checkpoint(TRUNCATE)");
  client.close();
  renameSync(fresh, path);
  return path;
};

export type TestDatabase = Readonly<{ db: Db; path: string; close: () => Promise<void> }>;

/** A new, migrated file database of its own, removed by `close`. */
export const testDatabase = async (options: { limitMs?: number } = {}): Promise<TestDatabase> => {
  const folder = mkdtempSync(join(tmpdir(), "flitchbook-test-"));
  const path = join(folder, "test.db");
  copyFileSync(await template(), path);
  const db = await openDb(`file:${path}`, { readerCacheKib: 2048, ...options });
  return {
    db,
    path,
    close: async () => {
      await db.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
};

export type TestFirm = Readonly<{
  organisationId: string;
  /** Ids of "Plate girders" and "Rolled beams", in that order. */
  bayIds: readonly [string, string];
  actors: Record<Role, Actor>;
}>;

/** An organisation with two bays and one member of each role, written straight into the tables. */
export const makeFirm = (db: Db, name = "Test Works"): Promise<TestFirm> =>
  db.write(async (tx) => {
    const organisationId = newId();
    const bayIds = [newId(), newId()] as const;
    await tx.insert(organisations).values({ id: organisationId, name, createdAt: NOW });
    await tx.insert(bays).values([
      { id: bayIds[0], organisationId, name: "Plate girders", ordinal: 1, createdAt: NOW },
      { id: bayIds[1], organisationId, name: "Rolled beams", ordinal: 2, createdAt: NOW },
    ]);
    const made: [Role, Actor][] = [];
    for (const role of ROLES) made.push([role, await addMember(tx, organisationId, role)]);
    return { organisationId, bayIds, actors: Object.fromEntries(made) as Record<Role, Actor> };
  });

export const addMember = async (
  tx: Parameters<Parameters<Db["write"]>[0]>[0],
  organisationId: string,
  role: Role,
  passwordHash: string | null = null,
): Promise<Actor> => {
  const userId = newId();
  const membershipId = newId();
  const name = `Test ${role}`;
  await tx
    .insert(users)
    .values({ id: userId, email: `${role}.${userId}@test.example`, name, passwordHash, createdAt: NOW });
  await tx.insert(memberships).values({ id: membershipId, organisationId, userId, role, createdAt: NOW });
  return { userId, membershipId, organisationId, name, role, rights: {}, via: "session" };
};

export type TestOrganisation = TestFirm &
  Readonly<{
    db: Db;
    path: string;
    /** Context of a member by role, or with rights beside it. */
    as: (role: Role, rights?: Actor["rights"]) => Ctx;
    /** Somebody with the same role in another organisation of the same database. */
    stranger: (role: Role) => Ctx;
    close: () => Promise<void>;
  }>;

/**
 * An organisation of its own on a real, migrated database, with a second one beside it for strangers.
 * Inside a test it closes itself; made in `beforeAll`, call `close` in `afterAll`.
 */
export const testOrganisation = async (
  options: { limitMs?: number; closesItself?: boolean } = {},
): Promise<TestOrganisation> => {
  const { db, path, close } = await testDatabase(
    options.limitMs === undefined ? {} : { limitMs: options.limitMs },
  );
  const firm = await makeFirm(db);
  const other = await makeFirm(db, "Other Works");
  const ctxOf = (actor: Actor): Ctx => ({ actor, db, now: Date.now(), requestId: newId() });
  if (options.closesItself) onTestFinished(close);
  return {
    ...firm,
    db,
    path,
    as: (role, rights = {}) => ctxOf({ ...firm.actors[role], rights }),
    stranger: (role) => ctxOf(other.actors[role]),
    close,
  };
};
