import { expect, test } from "vitest";
import { expectRel } from "@/tests/helpers/expect-rel";

test("expectRel refuses a value outside its relative tolerance", () => {
  expect(() => expectRel(1.01, 1, { rel: 1e-3 })).toThrow();
  expectRel(1.0009, 1, { rel: 1e-3 });
});

test("expectRel refuses NaN, null and an unscaled zero", () => {
  expect(() => expectRel(Number.NaN, 1, { rel: 1 })).toThrow();
  expect(() => expectRel(null, 1, { rel: 1 })).toThrow();
  expect(() => expectRel(0, 0, { rel: 1 })).toThrow();
  expectRel(1e-10, 0, { rel: 1e-9, scale: 1 });
});
