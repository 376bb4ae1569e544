import Papa from "papaparse";
import type { Drawing } from "@/lib/drawing/schema";
import { transformedFor } from "@/lib/drawing/transformed-for";
import { NOT_CHECKED } from "@/lib/export/not-checked";
import { familyOfRow } from "@/lib/intake/family-of-row";
import type { DimensionKey } from "@/lib/intake/fields";
import { harmless } from "@/lib/intake/queries-csv";

/** One shape as it is exported: figures in mm, mm² … and kg/m, null where there is none. */
export type ExportedShape = Readonly<{
  designation: string;
  family: string;
  series: string;
  bay: string;
  letter: string;
  state: string;
  title: string;
  source: string;
  figures: Readonly<Partial<Record<ExportedFigure, number | null>>>;
  unsymmetrical: Readonly<{ factorX: number; factorY: number; SxFree: number; SyFree: number }> | null;
  drawing: Drawing | null;
}>;

const FIGURES = {
  mass: "kg/m",
  area: "mm2",
  Ix: "mm4",
  Sx: "mm3",
  Zx: "mm3",
  rx: "mm",
  Iy: "mm4",
  Sy: "mm3",
  Zy: "mm3",
  ry: "mm",
  J: "mm4",
  Cw: "mm6",
} as const;
export type ExportedFigure = keyof typeof FIGURES;
const FIGURE_KEYS = Object.keys(FIGURES) as readonly ExportedFigure[]; // safe: the keys of a literal

const DIMENSIONS = [
  "depth",
  "width",
  "webThickness",
  "flangeThickness",
  "thickness",
  "rootRadius",
  "toeRadius",
  "outerRadius",
  "innerRadius",
  "diameter",
  "lip",
] as const satisfies readonly DimensionKey[];

/** Dimensions of families under the name of the column that holds them. */
const COLUMN_OF: Readonly<Record<string, (typeof DIMENSIONS)[number]>> = {
  flangeWidth: "width",
  legLong: "depth",
  legShort: "width",
};

const HEADINGS = [
  "Designation",
  "Series",
  ...DIMENSIONS.map((name) => `${name} [mm]`),
  "flangeSlope",
  ...FIGURE_KEYS.map((key) => `${key} [${FIGURES[key]}]`),
  "Revision",
  "State",
  "Bay",
  "Title",
  "Figures",
  "Unsymmetrical: true stress over Mx/Sx",
  "Unsymmetrical: true stress over My/Sy",
  "Figures transformed for",
  "Caution",
] as const;

const number = (value: number | null | undefined): string =>
  value === null || value === undefined ? "" : String(value);

/** Dimensions of a drawing that is one profile and nothing else; a drawn section has none. */
const dimensionsOf = (drawing: Drawing | null): Readonly<Record<string, number>> => {
  const [part, ...more] = drawing?.parts ?? [];
  if (part === undefined || more.length > 0 || part.shape.kind !== "profile") return {};
  return Object.fromEntries(
    Object.entries(part.shape.dimensions).map(([name, value]) => [COLUMN_OF[name] ?? name, Number(value)]),
  );
};

/** The series where it tells the family when it is read back, else the family itself. */
const seriesOf = ({ series, family }: ExportedShape): string =>
  familyOfRow(series, "", null)?.family === family ? series : family;

const rowOf = (shape: ExportedShape): string[] => {
  const dimensions = dimensionsOf(shape.drawing);
  const text = [shape.designation, seriesOf(shape)].map(harmless);
  return [
    ...text,
    ...DIMENSIONS.map((name) => number(dimensions[name])),
    number(dimensions.flangeSlope),
    ...FIGURE_KEYS.map((key) => number(shape.figures[key])),
    ...[shape.letter, shape.state, shape.bay, shape.title, shape.source].map(harmless),
    number(shape.unsymmetrical?.factorX),
    number(shape.unsymmetrical?.factorY),
    harmless((shape.drawing && transformedFor(shape.drawing)) ?? ""),
  ];
};

const written = (rows: readonly (readonly string[])[]): string =>
  `${Papa.unparse(rows as string[][], { newline: "\r\n" })}\r\n`;

/** The headings of an export, with their units; Goods-in reads them back. */
export const shapesCsvHead = (): string => written([HEADINGS]);

/**
 * Rows of an export (RFC 4180): numbers bare, with a point and full precision; text that a spreadsheet would run gets a
 * leading apostrophe. The first row of all carries the caution.
 */
export const shapesCsvRows = (shapes: readonly ExportedShape[], first: boolean): string =>
  shapes.length === 0
    ? ""
    : written(shapes.map((shape, i) => [...rowOf(shape), first && i === 0 ? NOT_CHECKED : ""]));
