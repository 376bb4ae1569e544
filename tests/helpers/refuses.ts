import { expect } from "vitest";
import type { Db } from "@/db/client";
import type { ErrorCode } from "@/lib/errors";
import type { Verb } from "@/lib/permissions";

const TABLES =
  "organisations users memberships rights bays shapes revisions figures finder drawings takes comments log";

/** Every row of the tables that people's data stands in, to compare before and after. */
export const everything = async (db: Db): Promise<string> => {
  const parts: string[] = [];
  for (const table of TABLES.split(" ")) {
    const { rows } = await db.reader.execute(`SELECT * FROM "${table}" ORDER BY 1, 2`);
    parts.push(`${table} ${JSON.stringify(rows)}`);
  }
  return parts.join("\n");
};

/** The deed is refused with this code and has changed nothing at all. */
export const expectRefused = async (db: Db, code: ErrorCode, deed: () => Promise<unknown>): Promise<void> => {
  const before = await everything(db);
  await expect(deed()).rejects.toMatchObject({ code });
  expect(await everything(db)).toBe(before);
};

/** The newest entry of the log. */
export const newestDeed = async (db: Db) => {
  const { rows } = await db.reader.execute("SELECT * FROM log ORDER BY id DESC LIMIT 1");
  return rows[0];
};

/** The newest log entry is this verb about this thing, by this person. */
export const expectLogged = async (db: Db, verb: Verb, entityId: string, actorId: string): Promise<void> => {
  expect(await newestDeed(db)).toMatchObject({ verb, entity_id: entityId, actor_id: actorId });
};
