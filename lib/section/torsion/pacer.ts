/** Says when a long computation should hand over control: `due` is true once in about 8 ms. */
export type Pacer = Readonly<{ due: () => boolean }>;

const SLICE_MS = 8;
/** The clock is read once in this many questions. */
const QUESTIONS = 32;

export const makePacer = (): Pacer => {
  let last = performance.now();
  let asked = 0;
  return {
    due: () => {
      asked += 1;
      if (asked % QUESTIONS !== 0) return false;
      const now = performance.now();
      if (now - last < SLICE_MS) return false;
      last = now;
      return true;
    },
  };
};
