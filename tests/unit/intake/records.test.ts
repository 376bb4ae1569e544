import { readFileSync, readdirSync } from "node:fs";
import fc from "fast-check";
import Papa from "papaparse";
import { describe, expect, test } from "vitest";
import { decodeBytes } from "@/lib/intake/decode-bytes";
import { DELIMITERS } from "@/lib/intake/delimiters";
import { findDelimiter, firstRecords, recordsOf, type TableRecord } from "@/lib/intake/records";
import { bytesOf } from "./intake-of";

const SPECTRUM = "node_modules/csv-spectrum";
const all = (text: string, delimiter: (typeof DELIMITERS)[number]) => [...recordsOf(text, delimiter)];
const cells = (records: readonly TableRecord[]) => records.map((r) => r.cells);

describe("csv-spectrum, the whole of it", () => {
  const names = readdirSync(`${SPECTRUM}/csvs`).map((f) => f.replace(".csv", ""));
  test("has twelve files", () => expect(names).toHaveLength(12));
  test.each(names)("%s", (name) => {
    const decoded = decodeBytes(new Uint8Array(readFileSync(`${SPECTRUM}/csvs/${name}.csv`)));
    const text = decoded.ok ? decoded.value.text : "";
    const found = findDelimiter(text, 50);
    expect(found).toMatchObject({ ok: true, value: { delimiter: "," } });
    const [head = [], ...rows] = cells(all(text, ","));
    // The fixture's two files differ: its JSON is one object, with another telephone number.
    const own = name === "location_coordinates";
    const read: unknown = JSON.parse(
      readFileSync(`${SPECTRUM}/json/${name}.json`, "utf8").replaceAll("\\r\\n", "\\n"),
    );
    const expected = own ? [Object.assign({}, read, { "Contact Phone Number": "2095257564" })] : read;
    expect(rows.map((row) => Object.fromEntries(head.map((h, i) => [h, row[i]])))).toEqual(expected);
  });
});

describe("records", () => {
  test("an opening quote that is never closed costs its own line only", () => {
    const records = all('a;b\n"x;1\ny;2\nz;3', ";");
    expect(records.map((r) => [r.line, r.fault?.code ?? null, ...r.cells])).toEqual([
      [1, null, "a", "b"],
      [2, "quotes", "x", "1"],
      [3, null, "y", "2"],
      [4, null, "z", "3"],
    ]);
  });

  test("a quoted cell over several lines keeps the count of lines", () => {
    expect(all('a;b\n"one\ntwo";1\nc;d', ";").map((r) => r.line)).toEqual([1, 2, 4]);
  });

  test("too many columns and too long cells are named, never cut in silence", () => {
    const [wide] = all(";".repeat(1_000_000), ";");
    expect(wide?.fault).toMatchObject({
      code: "tooManyColumns",
      detail: expect.stringContaining("1000001 fields"),
    });
    const [, long] = all(`a;b\n${"x".repeat(10_485_760)};1`, ";");
    expect(long?.fault).toMatchObject({
      code: "cellTooLong",
      detail: expect.stringContaining("10485760 characters"),
    });
    expect(long?.cells[0]).toHaveLength(10_000);
  });

  test("more than a hundred broken quotes give the file back with the line", () => {
    const records = recordsOf('"a;b\n'.repeat(150).replaceAll('a;b\n"', 'a;b\n"x" '), ";");
    let next = records.next();
    while (next.done !== true) next = records.next();
    expect(next.value).toMatchObject({ code: "quotes.tooMany" });
  });

  test("what was written by a CSV writer is read back, whatever the cells and the chunk borders", () => {
    const cell = fc.string({
      unit: fc.constantFrom("a", "7", ",", ";", '"', "\n", " ", "é", "\t", "|"),
      maxLength: 12,
    });
    const table = fc.array(fc.array(cell, { minLength: 3, maxLength: 3 }), { minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(table, fc.constantFrom(...DELIMITERS), (rows, delimiter) => {
        const text = Papa.unparse([...rows], { delimiter, newline: "\n", quotes: true });
        expect(cells(all(text, delimiter))).toEqual(rows);
      }),
    );
  });

  test("chunk borders inside a quoted cell do not show", () => {
    const rows = Array.from({ length: 4000 }, (_, i) => [
      `row ${i}`,
      `two\nlines, "quoted" ${"x".repeat(i % 97)}`,
      String(i),
    ]);
    const text = Papa.unparse(rows, { newline: "\n" });
    expect(cells(all(text, ","))).toEqual(rows);
  });

  test("the delimiter is the one most lines agree on, or what sep= says", () => {
    const found = (text: string) => {
      const result = findDelimiter(text, 20);
      return result.ok ? result.value.delimiter : result.error.code;
    };
    expect(found("a;b\n1,5;2,5\n3,5;4,5")).toBe(";");
    expect(found("a\tb\n1,5\t2")).toBe("\t");
    expect(found("a|b\n1|2")).toBe("|");
    expect(found("sep=|\na;b|c\n")).toBe("|");
    expect(found("just words\nand more")).toBe("file.noDelimiter");
    expect(firstRecords("a;b\n\n1;2", ";", 5)).toHaveLength(2);
  });
});

test("line ends of all kinds in one file are one kind", () => {
  const decoded = decodeBytes(bytesOf("a;b\r\n1;2\r3;4\n5;6"));
  expect(decoded.ok && cells(all(decoded.value.text, ";"))).toEqual([
    ["a", "b"],
    ["1", "2"],
    ["3", "4"],
    ["5", "6"],
  ]);
});
