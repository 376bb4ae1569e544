import { createStore, del, entries, get, set, clear } from "idb-keyval";
import type { Drawing } from "@/lib/drawing/schema";

/** A drawing that the server has not got yet, with the state it was made from. */
export type JournalEntry = Readonly<{
  name: string;
  drawing: Drawing;
  of: Readonly<{ shapeId: string; ordinal: number }> | null;
  /** ETag of the saved state it grew from; null for a drawing never saved. */
  base: string | null;
  /** Who drew it: nobody else is shown it. */
  owner: string;
  at: string;
}>;

/** Key of the drawing that has no id yet. */
export const UNSAVED = "new";

const store = () => createStore("flitchbook", "journal");

export const readJournal = (id: string): Promise<JournalEntry | undefined> => get<JournalEntry>(id, store());
export const writeJournal = (id: string, entry: JournalEntry): Promise<void> => set(id, entry, store());
export const forgetJournal = (id: string): Promise<void> => del(id, store());
export const journalEntries = (): Promise<[string, JournalEntry][]> => entries<string, JournalEntry>(store());

/** Empties the journal: at sign-out nothing of a person stays in the browser. */
export const emptyJournal = (): Promise<void> => clear(store());
