import { expect } from "vitest";

type Tolerance = Readonly<{
  /** Largest allowed |actual − expected| / |expected|. */
  rel: number;
  /** Size against which a value expected to be 0 is judged (say the polar moment for Ixy). */
  scale?: number;
  name?: string;
}>;

/** Relative comparison with a stated tolerance; a zero expectation needs a `scale`. NaN never passes. */
export const expectRel = (actual: number | null, expected: number, { rel, scale, name }: Tolerance): void => {
  const size = Math.max(Math.abs(expected), scale ?? 0);
  if (size === 0) throw new Error("expectRel: an expected value of 0 needs a scale");
  const off = actual === null ? Number.POSITIVE_INFINITY : Math.abs(actual - expected) / size;
  const label = name === undefined ? "" : `${name}: `;
  expect(off <= rel, `${label}${actual} differs from ${expected} by ${off} of ${size}, allowed ${rel}`).toBe(
    true,
  );
};
