import type { LogQuery } from "@/lib/schemas/log";

/** Names of what the Office caches; the log is forgotten whole after every deed. */
export const officeKeys = {
  members: () => ["members"] as const,
  logs: () => ["log"] as const,
  log: (filter: LogQuery) => ["log", filter] as const,
  bays: () => ["bays"] as const,
  organisation: () => ["organisation"] as const,
} as const;
