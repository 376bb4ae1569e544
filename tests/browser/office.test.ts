import { expect, test } from "vitest";
import { browserSuite, expectAccessible, expectNoSidewaysScroll, picture } from "@/tests/helpers/browser";

const { person } = browserSuite();

test("an admin raises a designer's right in one bay by keyboard, and the log shows it", async () => {
  const { page } = await person({ as: "admin" });
  await page.goto("/office");
  const cell = page.getByRole("button", { name: /^T\. Nakamura, Plate girders:/ });
  expect(await cell.getAttribute("aria-label")).toContain("read only, by role");
  await cell.focus();
  await page.keyboard.press("3");
  await page
    .getByRole("button", { name: "T. Nakamura, Plate girders: release and withdraw, granted" })
    .waitFor();
  const newest = page.getByRole("table", { name: "Deeds, newest first" }).getByRole("row").nth(1);
  await newest.getByText("T. Nakamura, Plate girders").waitFor();
  expect(await newest.innerText()).toContain("rights");
  await page.keyboard.press("1");
  await page.getByRole("button", { name: "T. Nakamura, Plate girders: read only, by role" }).waitFor();
});

test("the choice of a right opens with Enter, says what the role gives, and closes with Escape", async () => {
  const { page } = await person({ as: "admin" });
  await page.goto("/office");
  await page.getByRole("button", { name: /^A\. Lindqvist, Rolled beams:/ }).focus();
  await page.keyboard.press("ArrowRight");
  await page.keyboard.press("Enter");
  const choice = page.getByRole("dialog", { name: "Right of A. Lindqvist in Rolled columns" });
  await choice.getByText("draft and submit, by role").waitFor();
  await picture(page, "office-right");
  await expectAccessible(page);
  await page.keyboard.press("Escape");
  await choice.waitFor({ state: "hidden" });
});

test("the last admin cannot lower their own role, and is told so", async () => {
  const { page } = await person({ as: "admin" });
  await page.goto("/office");
  await page.getByRole("combobox", { name: "Role of J. Harrow" }).selectOption("designer");
  await page.getByRole("alert").getByText("The last admin stays an admin").waitFor();
  expect(await page.getByRole("combobox", { name: "Role of J. Harrow" }).inputValue()).toBe("admin");
});

test("a librarian adds, renames and deletes a bay", async () => {
  const { page } = await person({ as: "librarian" });
  await page.goto("/office");
  await page.waitForURL("**/office/bays");
  await page.getByRole("button", { name: "Add a bay" }).click();
  await page.getByRole("textbox", { name: "Name", exact: true }).fill("Purlins");
  await page.getByRole("button", { name: "Add", exact: true }).click();
  const name = page.getByRole("textbox", { name: "Name of bay 9" });
  await name.fill("Purlins and rails");
  await name.press("Enter");
  await expect
    .poll(() => page.getByRole("textbox", { name: "Name of bay 9" }).inputValue())
    .toBe("Purlins and rails");
  const row = page.getByRole("row").filter({ has: name });
  await expect.poll(() => row.getByRole("button", { name: "Save" }).isDisabled()).toBe(true);
  await row.getByRole("button", { name: "Delete" }).click();
  await page.getByRole("button", { name: "Delete the bay" }).click();
  await name.waitFor({ state: "detached" });
});

test("the log is filtered by deed, and the filter stands in the address", async () => {
  const { page } = await person({ as: "admin" });
  await page.goto("/office/log?verb=revision.release");
  const rows = page.getByRole("table", { name: "Deeds, newest first" }).getByRole("row");
  await expect.poll(() => rows.count()).toBeGreaterThan(50);
  const words = await rows.allInnerTexts();
  expect(words.slice(1).filter((text) => !text.includes("released"))).toEqual([]);
  await picture(page, "office-log");
});

test("a designer is told what they may do and who can do the rest", async () => {
  const { page } = await person({ as: "designer" });
  for (const path of ["/office", "/office/bays", "/office/log", "/office/firm"]) {
    await page.goto(path);
    await page.getByText("The Office is for admins.").waitFor();
  }
  const row = page.getByRole("row").filter({ hasText: "Job specials" });
  expect(await row.innerText()).toContain("draft and submit");
  await expectAccessible(page);
});

test.each([
  [1440, "light"],
  [1440, "dark"],
  [768, "light"],
  [390, "dark"],
  [320, "light"],
] as const)("the Office has no violation at %i px in the %s theme", async (width, theme) => {
  const { page } = await person({ as: "admin", width, theme });
  for (const name of ["", "/bays", "/log", "/firm"]) {
    await page.goto(`/office${name}`);
    await page.waitForLoadState("networkidle");
    await picture(page, `office${name.replace("/", "-")}-${width}-${theme}`);
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
  }
});
