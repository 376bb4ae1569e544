import type { Page } from "playwright-core";
import { expect } from "vitest";

/** What a test does on the Bench, in the drawing's own millimetres. */
export const benchPage = (page: Page) => {
  const canvas = page.getByRole("application");
  const cell = (label: string) => page.getByLabel(label, { exact: true });
  const row = page.locator("[data-add-row]");
  /** Where a point of the drawing (mm) lies in the window (px), as the sheet is seen now. */
  const screen = async (x: number, y: number) => {
    const box = await canvas.boundingBox();
    const view = await canvas.getAttribute("data-view");
    if (!box || !view) throw new Error("the canvas is not there yet");
    const [xPx = 0, yPx = 0, pxPerMm = 1] = view.split(" ").map(Number);
    return { x: box.x + xPx + x * pxPerMm, y: box.y + yPx - y * pxPerMm };
  };
  const hand = async (x: number, y: number, steps = 4) => {
    const p = await screen(x, y);
    await page.mouse.move(p.x, p.y, { steps });
  };
  return {
    canvas,
    cell,
    row,
    screen,
    hand,
    open: async (path = "/bench") => {
      await page.goto(path);
      await row.waitFor();
      await expect.poll(() => canvas.getAttribute("data-view"), { timeout: 30_000 }).not.toBeNull();
    },
    type: async (...rows: string[]) => {
      for (const text of rows) {
        await row.fill(text);
        await row.press("Enter");
      }
    },
    set: async (label: string, text: string) => {
      await cell(label).fill(text);
      await cell(label).press("Enter");
    },
    drag: async (from: readonly [number, number], to: readonly [number, number]) => {
      await hand(...from);
      await page.mouse.down();
      await hand(...to, 8);
    },
    saved: () =>
      expect
        .poll(() => page.getByRole("status").allTextContents(), { timeout: 20_000 })
        .toContainEqual(expect.stringMatching(/^\d\d:\d\d:\d\d$/)),
    /** Figures of the About table by row name, as bare text. */
    figures: async (name: string) =>
      (
        await page
          .getByRole("row", { name: new RegExp(`^${name}`) })
          .first()
          .locator(".figure")
          .allTextContents()
      ).map((t) => t.replace("\u2212", "-")),
  };
};
