import "server-only";
import type { z } from "zod";
import { logCsvHead, logCsvRows } from "@/lib/export/log-csv";
import { mayAtAll } from "@/lib/permissions";
import { MAX_PAGE } from "@/lib/schemas/common";
import type { LogEntry, LogQuery } from "@/lib/schemas/log";
import type { VerbArgs } from "../context";
import { listLog } from "./list";

type Query = z.input<typeof LogQuery>;

/** The log as CSV with the filters of the list, newest first, a page at a time. Refusals come before the first piece. */
export const exportLog = async ({ ctx, input }: VerbArgs<Query>): Promise<AsyncGenerator<string>> => {
  mayAtAll(ctx.actor, "log.export");
  const query: Query = { ...input, limit: String(MAX_PAGE), cursor: undefined };
  const first = await listLog({ ctx, input: query });
  return (async function* () {
    yield `\ufeff${logCsvHead()}`;
    for (let page = first; ;) {
      yield logCsvRows(page.items.map(toRow));
      if (page.next === null) return;
      page = await listLog({ ctx, input: { ...query, cursor: page.next } });
    }
  })();
};

const told = (record: LogEntry["before"]): string => (record === null ? "" : JSON.stringify(record));

const toRow = (entry: LogEntry) => ({
  at: entry.at,
  actor: entry.actor.name,
  verb: entry.verb,
  subject: entry.subject,
  before: told(entry.before),
  after: told(entry.after),
  requestId: entry.requestId,
});
