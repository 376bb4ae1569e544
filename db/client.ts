import "server-only";
import { mkdirSync } from "node:fs";
import { dirname } from "node:path";
import { createClient, type Client, type Transaction } from "@libsql/client";
import { drizzle, type LibSQLDatabase } from "drizzle-orm/libsql";
import { environment } from "@/lib/env";
import { WriteQueue } from "./write-queue";

export type Reader = LibSQLDatabase;
/** A transaction of the writer: everything in it is kept or nothing. `raw` takes hand-made statements. */
export type Tx = Omit<LibSQLDatabase, "transaction" | "batch"> & Readonly<{ raw: Transaction }>;

/**
 * The database of this process. `read` never writes. `write` is the only way to write: it waits for the queue, opens an
 * IMMEDIATE transaction, and runs again from its start after a BUSY, so it must do nothing but database work.
 */
export type Db = Readonly<{
  read: Reader;
  write: <T>(work: (tx: Tx) => Promise<T>, label?: string) => Promise<T>;
  /** Takes the queue's slot without a transaction, for a worker thread that writes through its own connection. */
  exclusive: <T>(label: string, work: () => Promise<T>) => Promise<T>;
  /** The raw clients, for migrations, backup and health. */
  reader: Client;
  writer: Client;
  queue: WriteQueue;
  url: string;
  close: () => Promise<void>;
}>;

const CACHE_KIB = 64 * 1024;
const isLocal = (client: Client) => client.protocol === "file";

/** Where the file of a local database is; null for a server's address. */
export const filePathOf = (url: string): string | null =>
  url.startsWith("file:") ? decodeURIComponent(url.replace(/^file:(\/\/)?/, "").replace(/\?.*$/, "")) : null;

/** Sets what must hold for every connection and reads it back: a pragma that did not take ends the start. */
export const setPragmas = async (
  client: Client,
  { cacheKib = CACHE_KIB, queryOnly = false } = {},
): Promise<void> => {
  if (!isLocal(client)) return;
  await client.execute("PRAGMA journal_mode = WAL");
  await client.execute("PRAGMA synchronous = FULL");
  await client.execute("PRAGMA foreign_keys = ON");
  await client.execute(`PRAGMA cache_size = -${cacheKib}`);
  await client.execute(`PRAGMA query_only = ${queryOnly ? "ON" : "OFF"}`);
  await assertPragmas(client);
};

export const assertPragmas = async (client: Client): Promise<void> => {
  if (!isLocal(client)) return;
  const expected = { journal_mode: "wal", synchronous: 2, foreign_keys: 1 };
  for (const [pragma, value] of Object.entries(expected)) {
    const got = (await client.execute(`PRAGMA ${pragma}`)).rows[0]?.[0];
    if (got !== value) throw new Error(`database: PRAGMA ${pragma} is ${String(got)}, expected ${value}`);
  }
};

const connect = (url: string, authToken: string | undefined): Client => {
  const path = filePathOf(url);
  if (path !== null) mkdirSync(dirname(path), { recursive: true });
  return createClient({ url, concurrency: 1, ...(authToken === undefined ? {} : { authToken }) });
};

/** Safe: Drizzle only calls `execute` of its client for single statements, and a transaction has the same one. */
const asClient = (transaction: Transaction): Client => transaction as unknown as Client;

const inTransaction = async <T>(writer: Client, work: (tx: Tx) => Promise<T>): Promise<T> => {
  const raw = await writer.transaction("write");
  try {
    const result = await work(Object.assign(drizzle(asClient(raw)), { raw }));
    await raw.commit();
    return result;
  } catch (error) {
    try {
      raw.close();
    } catch (closing) {
      throw new Error(`rolling back failed (${String(closing)})`, { cause: error });
    }
    throw error;
  }
};

type OpenOptions = Readonly<{ authToken?: string | undefined; limitMs?: number; readerCacheKib?: number }>;

/** Opens a database with its reader, its writer and its queue, pragmas set and asserted. */
export const openDb = async (url: string, options: OpenOptions = {}): Promise<Db> => {
  const writer = connect(url, options.authToken);
  await setPragmas(writer);
  const reader = connect(url, options.authToken);
  await setPragmas(reader, {
    queryOnly: true,
    ...(options.readerCacheKib ? { cacheKib: options.readerCacheKib } : {}),
  });

  const queue = new WriteQueue({
    reconnect: async () => {
      await writer.reconnect();
      await setPragmas(writer);
    },
    ...(options.limitMs === undefined ? {} : { limitMs: options.limitMs }),
  });
  return {
    read: drizzle(reader),
    write: (work, label = "") => queue.run(label, () => inTransaction(writer, work)),
    exclusive: (label, work) => queue.run(label, work),
    reader,
    writer,
    queue,
    url,
    close: async () => {
      reader.close();
      if (isLocal(writer)) await writer.execute("PRAGMA wal_checkpoint(TRUNCATE)");
      writer.close();
    },
  };
};

const store = globalThis as typeof globalThis & { flitchbookDb?: Promise<Db> };

/** The one database of the process, opened at first use: the build imports this file, and Next loads it three times. */
export const database = (): Promise<Db> => {
  const { DATABASE_URL, DATABASE_AUTH_TOKEN } = environment();
  store.flitchbookDb ??= openDb(DATABASE_URL, { authToken: DATABASE_AUTH_TOKEN });
  return store.flitchbookDb;
};

export const closeDatabase = async (): Promise<void> => {
  const open = store.flitchbookDb;
  delete store.flitchbookDb;
  if (open) await (await open).close();
};
