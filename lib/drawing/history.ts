/** Steps that can be undone. */
export const MAX_STEPS = 200;

/**
 * What was, what is, what was undone. One gesture is one step: `mark` at its start, `preview` while it goes on, `commit` at
 * its end or `bail` back to the mark. What is picked lives elsewhere, so a pick never clears what can be redone.
 */
export type History<T> = Readonly<{ past: readonly T[]; now: T; future: readonly T[]; mark: T | null }>;

export const startHistory = <T>(now: T): History<T> => ({ past: [], now, future: [], mark: null });

/** A finished change as one step. A change to the very same state is no step. */
export const record = <T>(h: History<T>, next: T): History<T> =>
  next === h.now ? h : { past: [...h.past, h.now].slice(-MAX_STEPS), now: next, future: [], mark: null };

/** Begins a gesture; a gesture that is going on keeps its mark. */
export const mark = <T>(h: History<T>): History<T> => (h.mark === null ? { ...h, mark: h.now } : h);

/** Shows a state within a gesture; nothing is recorded and nothing that was undone is lost. */
export const preview = <T>(h: History<T>, next: T): History<T> =>
  h.mark === null ? { ...h, mark: h.now, now: next } : { ...h, now: next };

/** Ends a gesture as one step, or as none where nothing changed. */
export const commit = <T>(h: History<T>): History<T> => {
  if (h.mark === null) return h;
  if (h.mark === h.now) return { ...h, mark: null };
  return { past: [...h.past, h.mark].slice(-MAX_STEPS), now: h.now, future: [], mark: null };
};

/** Goes back to the mark: Escape. */
export const bail = <T>(h: History<T>): History<T> =>
  h.mark === null ? h : { ...h, now: h.mark, mark: null };

/** One step back; a gesture that is going on is given up first. */
export const undo = <T>(h: History<T>): History<T> => {
  const settled = bail(h);
  const previous = settled.past.at(-1);
  if (previous === undefined) return settled;
  return {
    past: settled.past.slice(0, -1),
    now: previous,
    future: [settled.now, ...settled.future],
    mark: null,
  };
};

export const redo = <T>(h: History<T>): History<T> => {
  const settled = bail(h);
  const next = settled.future[0];
  if (next === undefined) return settled;
  return { past: [...settled.past, settled.now], now: next, future: settled.future.slice(1), mark: null };
};
