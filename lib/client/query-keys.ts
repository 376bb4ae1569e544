/** Names of what the browser caches; the first word is the resource, so that a change can forget all of it. */
export const queryKeys = {
  me: () => ["me"] as const,
  waiting: () => ["waiting"] as const,
  bays: () => ["bays"] as const,
  shapes: (search: Readonly<Record<string, unknown>>) => ["shapes", "search", search] as const,
  shapeCounts: (search: Readonly<Record<string, unknown>>) => ["shapes", "counts", search] as const,
  shape: (id: string) => ["shapes", "one", id] as const,
  savedSearches: () => ["saved-searches"] as const,
  drawings: () => ["drawings"] as const,
  drawing: (id: string) => ["drawings", id] as const,
  deliveries: () => ["deliveries"] as const,
  delivery: (id: string) => ["deliveries", id] as const,
} as const;
