import { expect, test } from "vitest";
import { Designation, designationKey, foldForSearch } from "@/lib/schemas/designation";

test.each(["PG 0580-2", "007", "1e3", "RB 540×210×97", "HE 200 B (S355)", "Ø 219.1 x 8", "L 100×65×8½"])(
  "%s is kept as it was typed",
  (text) => {
    expect(Designation.parse(text)).toBe(text);
  },
);

test.each([
  "=SUM(A1)",
  "+1",
  "-1",
  "@x",
  "'007",
  "",
  "   ",
  "x".repeat(121),
  "日本",
  "a\u0000b",
  "a\u202eb",
  "＝1",
])("%j is refused", (text) => {
  expect(Designation.safeParse(text).success).toBe(false);
});

test("spaces are single, ends trimmed, letters composed", () => {
  expect(Designation.parse("  PG  1  ")).toBe("PG 1");
  expect(Designation.parse("e\u0301")).toBe("\u00e9");
});

test("case and × do not make a second designation, spacing does", () => {
  expect(designationKey("RB 540×210")).toBe(designationKey("rb 540X210"));
  expect(designationKey("RB540")).not.toBe(designationKey("RB 540"));
});

test("a search forgives spacing, case and ×", () => {
  expect(foldForSearch("rb540 x 210")).toBe(foldForSearch("RB 540×210"));
});
