/** SQLite's two ways to say that somebody else holds the lock. */
export const isBusy = (error: unknown): boolean => {
  for (let e = error; e instanceof Error; e = e.cause) {
    const code = "code" in e ? String(e.code) : "";
    if (/^SQLITE_(BUSY|LOCKED)/.test(code) || /database (table )?is locked/.test(e.message)) return true;
  }
  return false;
};

/** The disk took no more. */
export const isFull = (error: unknown): boolean => {
  for (let e = error; e instanceof Error; e = e.cause) {
    const code = "code" in e ? String(e.code) : "";
    if (/^SQLITE_FULL/.test(code) || /database or disk is full/.test(e.message)) return true;
  }
  return false;
};

/** A unique index refused; the columns as SQLite names them ("shapes.organisation_id, …") or the index's name. */
export const uniqueViolation = (error: unknown): string | null => {
  for (let e = error; e instanceof Error; e = e.cause) {
    const found = /UNIQUE constraint failed: (.+)$/.exec(e.message);
    if (found?.[1]) return found[1];
  }
  return null;
};
