import type { SectionProperties } from "@/lib/section/properties";
import { UNIT_OF, type PropertyKey } from "@/lib/units/property-units";
import { PROPERTY_NAME } from "@/lib/units/property-names";

export type FigureLine = Readonly<{ key: PropertyKey; name: string; value: number | null; unit: string }>;

const at = (p: unknown, path: string): number | null => {
  const found = path
    .split(".")
    .reduce<unknown>(
      (o, k) => (o && typeof o === "object" ? (o as Record<string, unknown>)[k] : undefined),
      p,
    ); // safe: read only
  return typeof found === "number" && Number.isFinite(found) ? found : null;
};

/** Every scalar property with its key, its name and its stored unit, full precision. */
export const figureLines = (p: SectionProperties): FigureLine[] =>
  (Object.keys(UNIT_OF) as PropertyKey[]).map((key) => ({
    key,
    name: PROPERTY_NAME[key],
    value: at(p, key),
    unit: UNIT_OF[key],
  }));

/** A cell that no spreadsheet runs: text that begins like a formula gets an apostrophe, quotes are doubled. */
export const textCell = (text: string, separator: "," | "\t"): string => {
  const guarded = /^[=+\-@\t\r＝＋－＠]/.test(text) ? `'${text}` : text;
  const clean = separator === "\t" ? guarded.replace(/[\t\r\n]+/g, " ") : guarded;
  return /["\r\n,;]/.test(clean) && separator === "," ? `"${clean.replaceAll('"', '""')}"` : clean;
};

const HEAD = ["property", "name", "value", "unit"] as const;

/**
 * Figures as lines of text: comma-separated for a file (RFC 4180), tab-separated for the clipboard. Numbers are bare and carry
 * full precision; what was not computed is empty.
 */
export const figuresText = (p: SectionProperties, title: string, separator: "," | "\t"): string => {
  const end = separator === "," ? "\r\n" : "\n";
  const row = (cells: readonly string[]) => cells.map((c) => textCell(c, separator)).join(separator);
  const lines = figureLines(p).map(({ key, name, value, unit }) =>
    [textCell(key, separator), textCell(name, separator), value === null ? "" : String(value), unit].join(
      separator,
    ),
  );
  const marks = p.unsymmetrical
    ? [
        row(["unsymmetrical.factorX", "True extreme stress over M/S under Mx alone"]) +
          separator +
          String(p.unsymmetrical.factorX) +
          separator +
          "1",
        row(["unsymmetrical.SxFree", "Elastic modulus for free bending under Mx"]) +
          separator +
          String(p.unsymmetrical.SxFree) +
          separator +
          "mm3",
      ]
    : [];
  return [row(["section", title, "", ""]), row(HEAD), ...lines, ...marks].join(end) + end;
};
