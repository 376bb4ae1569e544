import { expect, test } from "vitest";
import type { Page } from "playwright-core";
import { browserSuite, expectAccessible, expectNoSidewaysScroll, picture } from "@/tests/helpers/browser";

const { person } = browserSuite();

const rows = (page: Page) => page.getByRole("grid", { name: "Shapes" }).locator("tr[data-row]");
const masses = async (page: Page) =>
  (await rows(page).locator("td:nth-child(6)").allInnerTexts()).map((text) =>
    Number(text.replace(/\s/g, "")),
  );

test("a designer finds shapes by minimum S and I, typed with units, lightest first, and can send the address", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack");
  await page.getByRole("textbox", { name: "Min S x" }).fill("1500 cm3");
  await page.keyboard.press("Enter");
  await page.waitForURL("**minSx=1500000**");
  await page.getByRole("textbox", { name: "Min I x" }).fill("2*200");
  await page.keyboard.press("Enter");
  await page.waitForURL("**minIx=400000000**");
  await page.getByRole("columnheader", { name: /Over min/ }).waitFor();
  await page.locator('section[aria-label="Hits"][aria-busy="false"]').waitFor();
  const found = await masses(page);
  expect(found.length).toBeGreaterThan(3);
  expect(found).toEqual([...found].sort((a, b) => a - b));
  for (const text of await rows(page).locator("td:nth-child(12)").allInnerTexts())
    expect(Number(text.replace(/\s/g, ""))).toBeGreaterThanOrEqual(0);
  await expectAccessible(page);

  const other = await person({ as: "engineer" });
  await other.page.goto(page.url());
  expect(await masses(other.page)).toEqual(found);
});

test("a head sorts its column, rising and then falling", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack");
  await page.getByRole("button", { name: "Depth" }).click();
  await page.waitForURL("**sort=depth**");
  await page.getByRole("button", { name: "Depth" }).click();
  await page.waitForURL("**sort=-depth**");
  await page.locator('th[aria-sort="descending"]').getByText("Depth").waitFor();
});

test("rows are taken in hand, compared and opened by keyboard", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack?minSx=1500000");
  await rows(page).first().waitFor();
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("c");
  await page.waitForURL("**with=**");
  await page.keyboard.press("ArrowDown");
  const inHand = page.locator('tr[aria-selected="true"]');
  const name = (await inHand.locator("td:nth-child(2) a").innerText()).trim();
  await page.getByRole("complementary", { name: `Preview of ${name}` }).waitFor();
  await page.getByRole("img", { name: `Section of ${name}` }).waitFor();
  await expectAccessible(page);
  await picture(page, "rack-1440");
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/rack\/[^?]+$/);
  await page.getByRole("heading", { level: 1, name: `${name}, revision A` }).waitFor({ state: "attached" });
});

test("a double press opens the sheet, and going back finds the row in hand", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack?q=PG0530-2");
  await rows(page).first().click();
  await page.waitForURL("**at=**");
  await rows(page).first().dblclick();
  await page.waitForURL(/\/rack\/[^?]+$/);
  await page.goBack();
  await page.locator('tr[aria-selected="true"]').getByText("PG 0530-2").waitFor();
});

test("text forgives case, spaces and the cross; nothing found says what to loosen", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack");
  await page.keyboard.press("f");
  await page.keyboard.type("rb540X210");
  await page.keyboard.press("Enter");
  await page.waitForURL("**q=rb540X210**");
  await rows(page).first().waitFor();
  for (const text of await rows(page).locator("td:nth-child(2)").allInnerTexts())
    expect(text.replace(/\s/g, "").toLowerCase()).toContain("rb540x210");

  await page.goto("/rack?minSx=1500000&maxDepth=100");
  await page.getByText("Nothing on the Rack meets all of this.").waitFor();
  await expectAccessible(page);
  await picture(page, "rack-nothing-found");
  await page.getByRole("button", { name: /^Let max depth go to/ }).click();
  await rows(page).first().waitFor();
});

test("the sheet shows what the section is, what was not checked, and prints at a true scale", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack?q=PG0530-2");
  await rows(page).first().getByRole("link").click();
  await page.waitForURL(/\/rack\/[^?]+$/);
  await page.getByRole("img", { name: "Section of PG 0530-2, revision A" }).first().waitFor();
  await page.getByText("Not checked by this sheet").waitFor();
  await page.getByText("1 : 5 on A4").waitFor();
  // Designers read: the way on is a copy, not a revision.
  await page.getByRole("link", { name: "Copy to Bench" }).waitFor();
  expect(await page.getByRole("button", { name: "Withdraw" }).count()).toBe(0);
  await expectAccessible(page);
  await picture(page, "shape-sheet-1440");

  // 530 mm at 1 : 5 are 106 mm on paper; a CSS px is 1/96 in.
  await page.emulateMedia({ media: "print" });
  const paper = page.locator("svg[aria-label='Section of PG 0530-2, revision A']").last();
  const depthPx = await paper.evaluate((svg) => {
    const cut = [...svg.querySelectorAll("path")].filter((p) => p.getAttribute("stroke") === "var(--fb-cut)");
    const boxes = cut.map((p) => p.getBBox());
    return Math.max(...boxes.map((b) => b.y + b.height)) - Math.min(...boxes.map((b) => b.y));
  });
  expect(Math.abs(depthPx / ((106 * 96) / 25.4) - 1)).toBeLessThan(0.005);
});

test("inches and the decimal comma follow the person", async () => {
  const { page } = await person({ as: "librarian" });
  await page.goto("/rack?q=PG0530-2");
  await page.getByRole("button", { name: "R. Okafor" }).click();
  await page.getByRole("menuitemradio", { name: /^inch/ }).click();
  await page.getByRole("menuitemradio", { name: /^comma/ }).click();
  await page.keyboard.press("Escape");
  await page.locator("th").getByText("lb/ft").waitFor();
  // 87.1 kg/m are 58.6 lb/ft.
  await rows(page).first().getByText("58,6").waitFor();
  await page.waitForTimeout(500);
  await page.reload();
  await rows(page).first().getByText("58,6").waitFor();
});

test("a check, a release and a take are recorded by the people they belong to, on a phone too", async () => {
  const list = await person({ as: "admin" });
  await list.page.goto("/rack?state=submitted");
  await rows(list.page).first().waitFor();
  const name = (await rows(list.page).first().locator("td:nth-child(2) a").innerText()).trim();
  await rows(list.page).first().getByRole("link").click();
  await list.page.waitForURL(/\/rack\/[^?]+/);
  const address = new URL(list.page.url()).pathname;
  await list.page.getByRole("button", { name: /^Check revision/ }).click();
  const check = list.page.getByRole("dialog", { name: new RegExp(`^Check ${name}`) });
  await check.getByRole("radio", { name: "hand check" }).click();
  await check.getByLabel(/^Where it is filed/).fill("Sheet 3 of the girder file");
  await expectAccessible(list.page);
  await check.getByRole("button", { name: "Record the check" }).click();
  await list.page.getByText("Sheet 3 of the girder file").waitFor();

  const phone = await person({ as: "librarian", width: 390, height: 844 });
  await phone.page.goto(address);
  await expectNoSidewaysScroll(phone.page);
  await expectAccessible(phone.page);
  await picture(phone.page, "shape-sheet-390");
  await phone.page.getByRole("button", { name: "Release", exact: true }).click();
  await phone.page.getByText("Released", { exact: true }).first().waitFor();

  const designer = await person({ as: "designer" });
  await designer.page.goto(address);
  await designer.page.getByRole("button", { name: "Record a take" }).click();
  const take = designer.page.getByRole("dialog", { name: /^Take / });
  await take.getByLabel("Job number").fill("J2231");
  await take.getByLabel("Pieces").fill("8");
  await take.getByRole("button", { name: "Record" }).click();
  await designer.page.getByRole("cell", { name: "J2231" }).waitFor();
});

test("withdrawing asks first, names who took it, and a stale step shows both states", async () => {
  const one = await person({ as: "librarian" });
  const two = await person({ as: "admin" });
  await one.page.goto("/rack?q=PG0600-4");
  await rows(one.page).first().getByRole("link").click();
  await one.page.waitForURL(/\/rack\/[^?]+$/);
  await two.page.goto(one.page.url());
  for (const { page } of [one, two]) {
    await page.getByRole("button", { name: "Withdraw", exact: true }).click();
    const dialog = page.getByRole("dialog", { name: /^Withdraw PG 0600-4/ });
    await dialog.getByText("No job took it.").waitFor();
    await dialog.getByLabel("Reason, for the log").fill("flange plate no longer rolled");
  }
  await expectAccessible(one.page);
  await one.page.getByRole("dialog").getByRole("button", { name: "Withdraw" }).click();
  await one.page.getByText("Withdrawn by R. Okafor.").waitFor();
  await two.page.getByRole("dialog").getByRole("button", { name: "Withdraw" }).click();
  await two.page.getByRole("dialog").getByRole("button", { name: "Leave it" }).click();
  await two.page.getByText("Somebody changed this revision while you looked at it.").waitFor();
  await two.page.getByRole("button", { name: "Show its present state" }).click();
  await two.page.getByText("Withdrawn by R. Okafor.").waitFor();
});

test("up to six shapes stand side by side at one scale", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack?minSx=1500000");
  await rows(page).first().waitFor();
  for (let i = 0; i < 3; i += 1) {
    await page.keyboard.press("ArrowDown");
    await page.keyboard.press("c");
  }
  await page.getByRole("link", { name: /, / }).click();
  await page.waitForURL("**/rack/compare?with=**");
  expect(await page.getByRole("img", { name: /^Section of/ }).count()).toBe(3);
  await expectAccessible(page);
  await picture(page, "compare-1440");
});

test.each([
  [1280, "dark"],
  [768, "light"],
  [390, "dark"],
  [320, "light"],
] as const)("the Rack stands at %i px, %s, without violations", async (width, theme) => {
  const { page } = await person({ as: "designer", width, theme });
  await page.goto("/rack?minSx=1500000");
  await page.getByText("PG 0530-2").first().waitFor();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await picture(page, `rack-${width}-${theme}`);
});
