import "server-only";

/** A stored moment as answers carry it. */
export const iso = (at: number): string => new Date(at).toISOString();
export const isoOrNull = (at: number | null): string | null => (at === null ? null : iso(at));
