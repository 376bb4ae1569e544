import type { SortColumn } from "@/lib/schemas/find-shapes";

/** Orders of a search in words: rising, falling. */
export const SORT_NAME: Record<SortColumn, readonly [string, string]> = {
  mass: ["mass, lightest first", "mass, heaviest first"],
  SxPerMass: ["S per mass, least first", "S per mass, most first"],
  depth: ["depth, shallowest first", "depth, deepest first"],
  width: ["width, narrowest first", "width, widest first"],
  area: ["area, least first", "area, greatest first"],
  Ix: ["I strong, least first", "I strong, greatest first"],
  Iy: ["I weak, least first", "I weak, greatest first"],
  I2: ["least I, least first", "least I, greatest first"],
  Sx: ["S strong, least first", "S strong, greatest first"],
  Sy: ["S weak, least first", "S weak, greatest first"],
  Zx: ["Z strong, least first", "Z strong, greatest first"],
  Zy: ["Z weak, least first", "Z weak, greatest first"],
  rx: ["r strong, least first", "r strong, greatest first"],
  ry: ["r weak, least first", "r weak, greatest first"],
  r2: ["least r, least first", "least r, greatest first"],
  J: ["torsion constant, least first", "torsion constant, greatest first"],
  Cw: ["warping constant, least first", "warping constant, greatest first"],
  jobs: ["jobs, fewest first", "jobs, most first"],
  designation: ["designation, A to Z", "designation, Z to A"],
  family: ["family, A to Z", "family, Z to A"],
};

const isColumn = (text: string): text is SortColumn => Object.hasOwn(SORT_NAME, text);

/** What a sort parameter means; anything unknown is the usual order. */
export function readSort(sort: string): Readonly<{ column: SortColumn; falling: boolean }> {
  const falling = sort.startsWith("-");
  const column = falling ? sort.slice(1) : sort;
  return isColumn(column) ? { column, falling } : { column: "mass", falling: false };
}

export const sortWords = (sort: string): string => {
  const { column, falling } = readSort(sort);
  return SORT_NAME[column][falling ? 1 : 0];
};

/** The parameter after a press on a column's head: rising first, then falling. */
export const nextSort = (sort: string, column: SortColumn): string => {
  const now = readSort(sort);
  return now.column === column && !now.falling ? `-${column}` : column;
};
