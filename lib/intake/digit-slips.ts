/** Slips of the hand on a written number, as the other numbers it may have been. Marks stay where they are. */
export type Slip = Readonly<{
  kind: "digits-swapped" | "one-digit" | "decimal-shifted";
  written: string;
  factorOfTen: number;
}>;

const DIGIT = /\d/;

/** Neighbouring digits exchanged: "1493" may have been "4193", "1943", "1439". */
export function swappedDigits(written: string): readonly string[] {
  const at = [...written].flatMap((c, i) => (DIGIT.test(c) ? [i] : []));
  return at.slice(1).flatMap((second, i) => {
    const first = at[i] ?? 0;
    if (written[first] === written[second]) return [];
    const chars = [...written];
    [chars[first], chars[second]] = [chars[second] ?? "", chars[first] ?? ""];
    return [chars.join("")];
  });
}

/** One digit typed wrong: every position with every other digit. */
export function oneDigitOff(written: string): readonly string[] {
  return [...written].flatMap((c, i) =>
    DIGIT.test(c)
      ? ["0", "1", "2", "3", "4", "5", "6", "7", "8", "9"]
          .filter((d) => d !== c)
          .map((d) => written.slice(0, i) + d + written.slice(i + 1))
      : [],
  );
}

/** Powers of ten by which a decimal mark slips. */
export const SHIFTS = [10, 0.1, 100, 0.01, 1000, 0.001] as const;
