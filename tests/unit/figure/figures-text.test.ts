import { expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { figuresText, textCell } from "@/lib/export/figures-text";
import { girder } from "@/tests/helpers/drawings";

const properties = () => {
  const p = computeProperties(girder());
  if (!p.ok) throw new Error("the girder computes");
  return p.value;
};

test("figures leave as lines with key, name, full precision and unit; what is missing is empty", () => {
  const lines = figuresText(properties(), "PG 632", ",").split("\r\n");
  expect(lines[0]).toBe("section,PG 632,,");
  expect(lines).toContain("area,Area,34232,mm2");
  expect(lines.find((l) => l.startsWith("J,"))).toMatch(/^J,Torsion constant,[^,]*,mm4$/);
  expect(figuresText(properties(), "PG\t632", "\t").split("\n")[0]).toBe("section\tPG 632\t\t");
});

test("no cell of text is run by a spreadsheet", () => {
  expect(["=1+1", "+a", "-a", "@a", "\ta"].map((t) => textCell(t, ",").replace(/^"/, "").charAt(0))).toEqual(
    Array(5).fill("'"),
  );
  expect(textCell('a "b", c', ",")).toBe('"a ""b"", c"');
});
