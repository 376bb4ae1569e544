import type { Box } from "@/lib/figure/display-list";

/** A box on screen, px, y down. */
export type ScreenBox = Readonly<{ left: number; right: number; top: number; bottom: number }>;

export const overlap = (a: ScreenBox, b: ScreenBox): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** A box of the drawing on a sheet whose origin is the drawing's. */
export const screenBox = (box: Box, pxPerMm: number): ScreenBox => ({
  left: box.xMin * pxPerMm,
  right: box.xMax * pxPerMm,
  top: -box.yMax * pxPerMm,
  bottom: -box.yMin * pxPerMm,
});

/** Width of a figure set in the 12 px half-em figure face. */
export const figureWidthPx = (text: string): number => text.length * 6.2 + 4;

/** Boxes already taken on the sheet; asks and takes in one step. */
export class Room {
  readonly #taken: ScreenBox[] = [];

  take(box: ScreenBox): void {
    this.#taken.push(box);
  }

  free(box: ScreenBox): boolean {
    return !this.#taken.some((other) => overlap(box, other));
  }

  takeIfFree(box: ScreenBox): boolean {
    if (!this.free(box)) return false;
    this.take(box);
    return true;
  }
}

/** Rows of intervals beside the material: each interval goes to the first row where nothing overlaps it. */
export class Rows {
  readonly #rows: { low: number; high: number }[][] = [];

  rowFor(low: number, high: number, from = 0): number {
    for (let i = from; ; i++) {
      const row = (this.#rows[i] ??= []);
      if (row.some((r) => low < r.high && r.low < high)) continue;
      row.push({ low, high });
      return i;
    }
  }

  get count(): number {
    return this.#rows.length;
  }
}
