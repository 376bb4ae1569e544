import "server-only";

const LETTERS = 26;
const A = 65;

/** Letter of a revision: 1 is A, 26 is Z, 27 is AA. */
export const letterOf = (ordinal: number): string => {
  let letters = "";
  for (let rest = ordinal; rest > 0; rest = Math.floor((rest - 1) / LETTERS)) {
    letters = String.fromCharCode(A + ((rest - 1) % LETTERS)) + letters;
  }
  return letters;
};
