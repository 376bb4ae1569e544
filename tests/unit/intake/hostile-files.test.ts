import fc from "fast-check";
import Papa from "papaparse";
import { describe, expect, test } from "vitest";
import { designationKey as schemaKey, Designation } from "@/lib/schemas/designation";
import { readDesignation } from "@/lib/intake/designation";
import { harmless } from "@/lib/intake/queries-csv";
import { bytesOf, takeIn, type Taken } from "./intake-of";

const HEAD = "Bezeichnung;Reihe;h [mm];b [mm];tw [mm];tf [mm];r [mm];A [cm²]";
const GOOD = "IPE 200;IPE;200;100;5,6;8,5;12;28,48";
const table = (...rows: readonly string[]) => bytesOf([HEAD, ...rows].join("\n"));
const cell = (column: number, text: string) =>
  GOOD.split(";")
    .map((c, i) => (i === column ? text : c))
    .join(";");
const utf16 = (text: string, bigEndian: boolean, cut = 0) => {
  const bytes = [...`\ufeff${text}`].flatMap((c) => {
    const u = c.charCodeAt(0);
    return bigEndian ? [u >> 8, u & 255] : [u & 255, u >> 8];
  });
  return new Uint8Array(bytes.slice(0, bytes.length - cut));
};
const join = (...parts: readonly Uint8Array[]) => new Uint8Array(parts.flatMap((p) => [...p]));
const raw = (...bytes: readonly number[]) => new Uint8Array(bytes);

/** Files that must be given back whole: name, bytes, code of the fault. */
const GIVEN_BACK: readonly (readonly [string, Uint8Array, string])[] = [
  ["no byte at all", raw(), "file.empty"],
  ["a line end only", bytesOf("\n"), "file.noDelimiter"],
  ["spaces", bytesOf("   \n  "), "file.noDelimiter"],
  ["a byte-order mark only", raw(0xef, 0xbb, 0xbf), "file.noDelimiter"],
  ["prose", bytesOf("Dear Sirs\nplease find enclosed"), "file.noDelimiter"],
  ["headings that nobody knows", bytesOf("foo;bar\nbaz;qux\n"), "file.noHeadings"],
  ["numbers without headings", bytesOf("200;100;5,6\n300;150;7,1\n"), "file.noHeadings"],
  ["a NUL in a cell", table(cell(0, "IPE\u0000200")), "file.controlCharacter"],
  ["an escape character", table(cell(0, "IPE\u001b[31m")), "file.controlCharacter"],
  ["a unit separator", bytesOf("a\u001fb\u001fc\n1\u001f2\u001f3"), "file.controlCharacter"],
  ["a workbook", join(raw(0x50, 0x4b, 3, 4), table(GOOD)), "file.notText"],
  ["an old workbook", raw(0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1), "file.notText"],
  ["a PDF", bytesOf("%PDF-1.7\n%âãÏÓ"), "file.notText"],
  ["a gzip archive", raw(0x1f, 0x8b, 8, 0), "file.notText"],
  ["Windows-1252", join(table(GOOD), raw(0x0a, 0x54, 0x72, 0xe4, 0x67, 0x65, 0x72)), "encoding.confirm"],
  ["UTF-8 cut in the last character", join(table(GOOD), raw(0xc3)), "encoding.confirm"],
  ["an overlong sequence", join(table(GOOD), raw(0xc0, 0xaf)), "encoding.confirm"],
  ["a surrogate in UTF-8", join(table(GOOD), raw(0xed, 0xa0, 0x80)), "encoding.confirm"],
  ["a byte beyond Unicode", join(table(GOOD), raw(0xf5, 0x80, 0x80, 0x80)), "encoding.confirm"],
  ["a lone 0xFF", join(table(GOOD), raw(0xff)), "encoding.confirm"],
  ["UTF-16 with half a code unit", utf16(`${HEAD}\n${GOOD}`, false, 1), "encoding.badByte"],
  ["UTF-16 BE with half a code unit", utf16(`${HEAD}\n${GOOD}`, true, 1), "encoding.badByte"],
  ["more than 200 headings", bytesOf(`${HEAD};${"x;".repeat(300)}\n${GOOD}`), "file.headings"],
  ["a heading of 10 MB", bytesOf(`${HEAD};${"x".repeat(10_485_760)}\n${GOOD}`), "file.headings"],
  [
    "more than 100 quotes that never close",
    table(
      ...Array.from({ length: 130 }, (_, i) => (i % 2 ? GOOD : `"x ${i}" y;${GOOD}`)),
      ...Array.from({ length: 130 }, () => `"a" b;${GOOD}`),
    ),
    "quotes.tooMany",
  ],
];

/** Files that are read, with one row (the first data row) that must say what is wrong with it: name, bytes, cause. */
const ROW_SAYS: readonly (readonly [string, Uint8Array, string])[] = [
  ["an opening quote never closed", table(`"${GOOD}`, GOOD), "quotes"],
  ["a quote closed in the middle", table(`"IPE" 200;${GOOD}`), "quotes"],
  ["a million columns", table(`${GOOD}${";".repeat(1_000_000)}`), "fields"],
  ["one cell of 10 MB", table(cell(0, "x".repeat(10_485_760))), "cell"],
  ["a cell of 10,001 characters", table(cell(0, "x".repeat(10_001))), "cell"],
  ["a row cut short", table("IPE 200;IPE;200"), "fields"],
  ["a surplus cell", table(`${GOOD};surplus`), "fields"],
  ["a formula with =", table(cell(0, "=SUM(A1:A3)")), "designation"],
  ["a formula with +", table(cell(0, "+1+1")), "designation"],
  ["a formula with -", table(cell(0, "-2+3")), "designation"],
  ["a formula with @", table(cell(0, "@SUM(1)")), "designation"],
  ["a wide =", table(cell(0, "\uff1dSUM(1)")), "designation"],
  ["an apostrophe first", table(cell(0, "'=1")), "designation"],
  ["a tab in the designation", table(cell(0, '"\t=1"').replaceAll('"', "")), "designation"],
  ["no designation", table(cell(0, "")), "designation"],
  ["a designation of 121 characters", table(cell(0, "x".repeat(121))), "designation"],
  ["Cyrillic letters that look Latin", table(cell(0, "ІРЕ 200")), "designation"],
  ["a right-to-left override", table(cell(0, "IPE\u202e002")), "designation"],
  ["a zero-width space", table(cell(0, "IPE\u200b200")), "designation"],
  ["an emoji", table(cell(0, "IPE 🙂")), "designation"],
  ["the replacement character", table(cell(0, "IPE \ufffd")), "designation"],
  ["1.234 in a file of commas", table(cell(7, "1.234")), "ambiguous"],
  ["text in a number", table(cell(7, "ca. 28,5")), "not-a-number"],
  ["NaN written out as a word", table(cell(2, "NaNcm")), "not-a-number"],
  ["Infinity", table(cell(2, "Infinity")), "not-a-number"],
  ["1e309", table(cell(2, "1e309")), "out-of-range"],
  ["thirty digits", table(cell(2, "9".repeat(30))), "out-of-range"],
  ["a negative size", table(cell(2, "-200")), "sign"],
  ["a size of 0", table(cell(4, "0")), "sign"],
  ["a blank size", table(cell(4, "")), "missing-dimension"],
  ["a web wider than the flange", table(cell(4, "120")), "geometry"],
  ["flanges thicker than the depth", table(cell(5, "120")), "geometry"],
  ["a fillet larger than the room for it", table(cell(6, "95")), "geometry"],
  ["a series that nobody knows", table("QQ 200;QQ;200;100;5,6;8,5;12;28,48"), "family"],
  [
    "a decimal point among commas",
    table(cell(7, "28.48"), ...Array.from({ length: 5 }, (_, i) => GOOD.replace("200;", `200 ${i};`))),
    "decimal-mark",
  ],
];

const faultOf = (taken: Taken) => taken.fault;

describe("a file that cannot be read is given back with its place", () => {
  test.each(GIVEN_BACK)("%s", (_, bytes, code) => {
    const fault = faultOf(takeIn(bytes));
    expect(fault).toMatchObject({ code });
    expect(fault?.line).toBeGreaterThanOrEqual(1);
    expect(fault?.column).toBeGreaterThanOrEqual(1);
    expect(fault?.detail.length).toBeGreaterThan(20);
  });
});

describe("a row that cannot be taken says why, and its line", () => {
  test.each(ROW_SAYS)("%s", (_, bytes, cause) => {
    const taken = takeIn(bytes);
    expect(taken.fault).toBeNull();
    const first = taken.rows[0]?.inspection;
    expect(first?.verdict).not.toBe("accepted");
    expect(first?.reasons.map((r) => r.cause)).toContain(cause);
    expect(first?.line).toBe(2);
    expect(first?.reasons.every((r) => r.detail.length > 10)).toBe(true);
  });
});

test("the corpus has sixty files or more", () =>
  expect(GIVEN_BACK.length + ROW_SAYS.length).toBeGreaterThanOrEqual(60));

describe("what only looks hostile is read", () => {
  test.each([
    [
      "mixed line ends",
      bytesOf(`${HEAD}\r\n${GOOD}\r${GOOD.replace("200;", "201;")}\n${GOOD.replace("200;", "202;")}`),
      3,
    ],
    ["blank lines and lines of delimiters", table("", GOOD, ";;;;;;;", "", GOOD.replace("200;", "201;")), 2],
    ["sep=; before the headings", bytesOf(`sep=;\n${HEAD}\n${GOOD}`), 1],
    [
      "a title and a blank line before the headings",
      bytesOf(`Northgate beams 2026;;;;;;;\n\n${HEAD}\n${GOOD}`),
      1,
    ],
    ["units in a second row", bytesOf(`Bezeichnung;Reihe;h;b;tw;tf;r;A\n;;mm;mm;mm;mm;mm;cm2\n${GOOD}`), 1],
    ["designations that look like numbers", table(cell(0, "007"), cell(0, "1e3")), 2],
    ["thousands spaces", table(cell(7, "28,48").replace("IPE 200", "IPE 200 a")), 1],
  ] as const)("%s", (_, bytes, rows) => {
    const taken = takeIn(bytes);
    expect(taken.fault).toBeNull();
    expect(taken.rows).toHaveLength(rows);
    expect(new Set(taken.rows.map((r) => r.inspection.verdict))).toEqual(new Set(["accepted"]));
  });

  test("007 and 1e3 stay text", () => {
    const taken = takeIn(table(cell(0, "007"), cell(0, "1e3")));
    expect(taken.rows.map((r) => r.inspection.designation)).toEqual(["007", "1e3"]);
  });
});

test("whatever the bytes, the answer is rows or a fault with a sentence; nothing is thrown", () => {
  const bytes = fc.oneof(
    fc.uint8Array({ maxLength: 400 }),
    fc.string({ unit: "binary", maxLength: 300 }).map(bytesOf),
    fc
      .array(fc.stringMatching(/^[A-Za-z0-9;,."\n =+-]{0,40}$/), { maxLength: 12 })
      .map((rows) => table(...rows)),
  );
  fc.assert(
    fc.property(bytes, (input) => {
      const taken = takeIn(new Uint8Array(input));
      expect(taken.fault === null || taken.fault.detail.length > 10).toBe(true);
      for (const { inspection } of taken.rows)
        expect(inspection.verdict === "accepted" || inspection.reasons.length > 0).toBe(true);
    }),
    // A cell that reads like a method of every object: looked up in a plain table, fixed in lib/intake/headings.ts.
    {
      numRuns: 300,
      examples: [[bytesOf(`${HEAD}\ntoString`)], [table("constructor;__proto__;hasOwnProperty")]],
    },
  );
});

test("a table written out and taken in again is the same table", () => {
  const size = (min: number, max: number) => fc.integer({ min: min * 10, max: max * 10 }).map((n) => n / 10);
  const row = fc.record({
    h: size(100, 900),
    b: size(60, 300),
    tw: size(4, 14),
    tf: size(6, 28),
    r: size(0, 18),
  });
  fc.assert(
    fc.property(
      fc.array(row, { minLength: 1, maxLength: 5 }),
      fc.constantFrom(";", "\t", "|"),
      (rows, delimiter) => {
        const lines = rows.map((s, i) =>
          [`I ${i}`, "I", s.h, s.b, s.tw, s.tf, s.r].map(String).map(harmless),
        );
        const text = Papa.unparse(
          [
            [
              "designation",
              "series",
              "depth [mm]",
              "flangeWidth [mm]",
              "webThickness [mm]",
              "flangeThickness [mm]",
              "rootRadius [mm]",
            ],
            ...lines,
          ],
          { delimiter },
        );
        const taken = takeIn(bytesOf(text));
        const back = taken.rows.map((r) =>
          r.inspection.profile?.family === "i-section" ? r.inspection.profile.dimensions : null,
        );
        expect(back).toEqual(
          rows.map((s) => ({
            depth: s.h,
            flangeWidth: s.b,
            webThickness: s.tw,
            flangeThickness: s.tf,
            rootRadius: s.r,
          })),
        );
      },
    ),
    { numRuns: 60 },
  );
});

test("designations are the same here and in the library's own rule", () => {
  fc.assert(
    fc.property(fc.string({ unit: "grapheme", maxLength: 20 }), (text) => {
      const here = readDesignation(text);
      const there = Designation.safeParse(text);
      if (here.ok) {
        expect(there.success, `${text} is taken here and refused by the library`).toBe(true);
        expect(here.value.key).toBe(schemaKey(here.value.text));
      }
    }),
    { numRuns: 500 },
  );
});
