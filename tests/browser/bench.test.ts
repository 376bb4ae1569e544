import { expect, test } from "vitest";
import { benchPage } from "@/tests/helpers/bench-page";
import { browserSuite, expectAccessible, expectNoSidewaysScroll, picture } from "@/tests/helpers/browser";

const { person } = browserSuite();

const GIRDER = ["280x32", "18x632-36-32", "420x36"] as const;

test("a girder is typed by keyboard alone, kept, saved as a draft and submitted", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.row.focus();
  for (const text of GIRDER) {
    await page.keyboard.type(text);
    await page.keyboard.press("Enter");
  }
  // 420·36 + 18·564 + 280·32 = 34,232 mm²; Ix by parallel axes 2,326.3·10⁶ mm⁴.
  await expect.poll(() => bench.figures("Second moment of area")).toContain("2326.3");
  expect(await page.getByText("34232", { exact: true }).count()).toBeGreaterThan(0);
  await expect
    .poll(() => page.locator("[data-figures]").textContent())
    .toMatch(/^A 34\D?232 mm\^2, I x 2\D?326\.3/);
  await bench.saved();
  expect(page.url()).toMatch(/\/bench\/[0-9a-f-]{36}$/);

  await page.locator("#drawing-name").fill("Hoist beam, typed");
  await page.getByRole("button", { name: "Save into a bay" }).focus();
  await page.keyboard.press("Enter");
  await page.getByRole("combobox", { name: "Bay" }).waitFor();
  await page.getByRole("textbox", { name: "Designation" }).fill("KB 632");
  await page.getByText("This designation is free.").waitFor();
  await page.keyboard.press("Enter");
  await page.getByRole("button", { name: "Submit for release" }).waitFor();
  await page.getByRole("button", { name: "Submit for release" }).click();
  await page.getByText("submitted", { exact: true }).waitFor();
  await bench.saved();
  await page.reload();
  await page.getByText("KB 632").first().waitFor();
});

test("a designation that is taken is refused while it is typed", async () => {
  const { page, context, at } = await person({ as: "engineer" });
  const taken = await context.request.get(at("/api/v1/shapes?limit=1"));
  const { items } = (await taken.json()) as { items: { designation: string }[] };
  const bench = benchPage(page);
  await bench.open();
  await bench.type("100x10");
  await page.getByRole("button", { name: "Save into a bay" }).click();
  await page.getByRole("textbox", { name: "Designation" }).fill(items[0]?.designation.toLowerCase() ?? "");
  await page.getByText("That designation is already in the library.").waitFor();
});

test("a row that cannot be read says why and stays", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.type("420x0");
  expect(await page.getByRole("alert").filter({ hasText: "no size" }).count()).toBe(1);
  expect(await bench.row.inputValue()).toBe("420x0");
});

test("sums, fractions and units are typed in the table, and a refused one leaves the last good value", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.type("100x10");
  await bench.set("Width of item 1", "12 3/4 in");
  expect(await bench.cell("Width of item 1").inputValue()).toBe("323.85");
  await bench.set("Height of item 1", "-4");
  await page.getByText("A part needs a size above 0.").waitFor();
  await expect.poll(() => bench.figures("Second moment of area")).toContain("0.0270");
});

test("every starter is put on the sheet and computes", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await expect.poll(() => page.getByRole("radio").count()).toBe(11);
  for (let i = 0; i < 11; i++) {
    const radio = page.getByRole("radio").nth(i);
    await radio.click();
    await page.getByRole("button", { name: "Put on the sheet" }).click();
    await expect.poll(async () => (await bench.figures("Radius of gyration")).length).toBeGreaterThan(1);
    await page.getByRole("button", { name: "Undo" }).click();
    await radio.waitFor();
  }
});

test("a starter's sizes stay together until a part is changed by hand", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await page.getByRole("button", { name: "Put on the sheet" }).click();
  await page.getByRole("button", { name: "its sizes" }).click();
  await page.getByRole("dialog").getByLabel("Depth").fill("700");
  await page.getByRole("button", { name: "Change the sizes" }).click();
  expect(await bench.cell("y of item 1").inputValue()).toBe("690");
  await bench.set("Width of item 2", "12");
  await expect.poll(() => page.getByRole("button", { name: "its sizes" }).count()).toBe(0);
});

test("a plate dragged to the flange's edge snaps, says so, and is one step; Escape goes back to before it", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.type(...GIRDER, "16x200");
  await bench.set("x of item 4", "150");
  await bench.set("y of item 4", "496");
  await bench.saved();
  await bench.drag([150, 450], [200, 452]);
  await page.getByText("flush with 3, right edge").waitFor();
  await picture(page, "bench-snap");
  await page.mouse.up();
  expect(await bench.cell("x of item 4").inputValue()).toBe("202");
  await page.keyboard.press("Control+z");
  expect(await bench.cell("x of item 4").inputValue()).toBe("150");
  await page.keyboard.press("Control+y");
  expect(await bench.cell("x of item 4").inputValue()).toBe("202");
  await bench.drag([202, 450], [300, 300]);
  await page.keyboard.press("Escape");
  await page.mouse.up();
  expect(await bench.cell("x of item 4").inputValue()).toBe("202");
  await page.keyboard.press("Control+z");
  expect(await bench.cell("x of item 4").inputValue()).toBe("150");
});

test("Q frees a drag from snapping, and a typed distance ends it", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.type("400x20", "100x20");
  await bench.set("y of item 2", "400");
  await bench.saved();
  await bench.drag([0, 400], [152, 400]);
  await page.keyboard.down("q");
  await bench.hand(153.3, 400);
  await page.getByText("free", { exact: true }).waitFor();
  await page.keyboard.up("q");
  await page.keyboard.type("75");
  await page.keyboard.press("Enter");
  await page.mouse.up();
  expect(await bench.cell("x of item 2").inputValue()).toBe("75");
});

test("an outline is drawn by mouse, one edge bent into an arc, one corner given a fillet", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.canvas.focus();
  await page.keyboard.press("o");
  for (const [x, y] of [
    [0, 0],
    [200, 0],
    [200, 300],
    [0, 300],
  ] as const) {
    await bench.hand(x, y);
    await page.mouse.down();
    await page.mouse.up();
  }
  await bench.hand(0, 0);
  await page.mouse.down();
  await page.mouse.up();
  await expect.poll(() => page.getByText("60000", { exact: true }).count()).toBeGreaterThan(0);
  await bench.drag([200, 150], [240, 150]);
  await page.getByText(/^radius /).waitFor();
  await page.mouse.up();
  await page.getByRole("button", { name: "Outline, item 1: its sizes" }).click();
  await page.getByRole("button", { name: "fillet" }).first().click();
  await expect.poll(() => page.getByRole("button", { name: "fillet" }).count()).toBe(5);
  await picture(page, "bench-outline");
});

test("overlapping and floating parts are named and mended with one click", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.type("200x20", "10x300");
  await bench.set("y of item 2", "165");
  await page.getByText("Overlap.").waitFor();
  await page.getByRole("button", { name: "set 2 against 1" }).click();
  await expect.poll(() => bench.cell("y of item 2").inputValue()).toBe("170");
  await bench.set("y of item 2", "180");
  await page.getByText("Floating.").waitFor();
  await page.getByRole("button", { name: "move against 1" }).click();
  await expect.poll(() => bench.cell("y of item 2").inputValue()).toBe("170");
});

test("60 parts are dragged together and every figure follows", async () => {
  const { page } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.type("20x20");
  await page.getByRole("button", { name: "Arrange" }).click();
  await page.getByRole("menuitem", { name: "Copies in a row…" }).click();
  await page.getByLabel("Copies", { exact: true }).fill("59");
  await page.getByLabel("Step to the right").fill("30");
  await page.getByLabel("Step to the right").press("Enter");
  await page.getByRole("button", { name: "Make the copies" }).click();
  await expect.poll(() => page.getByText("24000", { exact: true }).count()).toBeGreaterThan(0);
  await bench.saved();
  await bench.canvas.focus();
  await page.keyboard.press("Control+a");
  await bench.drag([900, 10], [900, 210]);
  await page.mouse.up();
  await expect.poll(() => bench.cell("y of item 60").inputValue()).toBe("210");
});

test("the sheet is kept: reload, a lost connection, and a state saved in another window", async () => {
  const { page, context, at, problems } = await person({ as: "engineer" });
  const bench = benchPage(page);
  await bench.open();
  await bench.type("300x20");
  await bench.saved();
  await page.reload();
  expect(await bench.cell("Width of item 1").inputValue()).toBe("300");

  await context.setOffline(true);
  await bench.set("Width of item 1", "310");
  await page.getByText("The server does not answer.").waitFor();
  await context.setOffline(false);
  await bench.saved();
  // Chromium itself reports what could not be loaded while the connection was gone.
  const expected = /ERR_INTERNET_DISCONNECTED/;
  expect(problems.filter((text) => !expected.test(text))).toEqual([]);
  problems.splice(0);

  const id = page.url().split("/").at(-1) ?? "";
  const now = await context.request.get(at(`/api/v1/drawings/${id}`));
  const record = (await now.json()) as { drawing: { parts: { shape: { width: number } }[] } };
  expect(record.drawing.parts[0]?.shape.width).toBe(310);
  const other = structuredClone(record.drawing);
  if (other.parts[0]) other.parts[0].shape.width = 400;
  const saved = await context.request.patch(at(`/api/v1/drawings/${id}`), {
    data: { drawing: other },
    headers: { "If-Match": now.headers().etag ?? "", Origin: at("") },
  });
  expect(saved.status()).toBe(200);
  await bench.set("Width of item 1", "320");
  await page.getByText(/saved in another window/).waitFor();
  await page.getByRole("button", { name: "Take that state (1 parts)" }).click();
  await expect.poll(() => bench.cell("Width of item 1").inputValue()).toBe("400");
  await page.keyboard.press("Escape");
  await bench.canvas.focus();
  await page.keyboard.press("Control+z");
  await expect.poll(() => bench.cell("Width of item 1").inputValue()).toBe("320");
  await bench.saved();
});

test.each([
  [1440, "light"],
  [1440, "dark"],
  [1280, "light"],
  [768, "light"],
  [768, "dark"],
  [390, "light"],
] as const)("the Bench at %i px, %s: nothing for axe to say, no sideways scroll", async (width, theme) => {
  const { page } = await person({ as: "engineer", width, theme, height: width < 820 ? 1024 : 900 });
  const bench = benchPage(page);
  await bench.open();
  if (width >= 480) await expectAccessible(page);
  await bench.type(...GIRDER, "16x200");
  await bench.set("x of item 4", "202");
  await bench.set("y of item 4", "496");
  await expect.poll(() => bench.figures("Radius of gyration")).toContain("252.4");
  await picture(page, `bench-${width}-${theme}`);
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
});
