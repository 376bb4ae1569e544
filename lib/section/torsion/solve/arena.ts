/**
 * One long array that grows: what many small arrays would hold, without the collector having to count them. Places taken
 * are given by their first index; the numbers themselves are in `data`, which is another array after growing.
 */
export type Arena = { data: Float64Array; used: number };

const FIRST_SIZE = 1 << 14;

const makeArena = (): Arena => ({ data: new Float64Array(FIRST_SIZE), used: 0 });

/** Takes `length` numbers at the end, not set to zero, and returns the first index. */
export const take = (arena: Arena, length: number): number => {
  const start = arena.used;
  arena.used += length;
  if (arena.used > arena.data.length) {
    const grown = new Float64Array(Math.max(arena.used, 2 * arena.data.length));
    grown.set(arena.data.subarray(0, start));
    arena.data = grown;
  }
  return start;
};

/** Gives back everything from `start` on. */
export const giveBack = (arena: Arena, start: number): void => {
  arena.used = start;
};

/** What the solver works in; one solution after another can use the same. */
export type Arenas = Readonly<{ front: Arena; passedOn: Arena; factors: Arena }>;

export const makeArenas = (): Arenas => ({ front: makeArena(), passedOn: makeArena(), factors: makeArena() });
