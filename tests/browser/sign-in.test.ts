import { expect, test } from "vitest";
import { browserSuite, expectAccessible, expectNoSidewaysScroll, picture } from "@/tests/helpers/browser";
import { DEMO_PASSWORD } from "@/tests/helpers/demo-accounts";

const { person } = browserSuite();

test("a page asked for without a session comes back after signing in, filter and all", async () => {
  const { page } = await person();
  await page.goto("/rack?minSx=400000");
  await page.waitForURL("**/sign-in?next=*");
  await page.getByLabel("E-mail").fill("designer@harrowtide.example");
  await page.getByLabel("Password").fill(DEMO_PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL("**/rack?minSx=400000");
  await page.getByRole("button", { name: "T. Nakamura" }).waitFor();
});

test("a wrong password is refused in words and what was typed stays", async () => {
  const { page } = await person();
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill("designer@harrowtide.example");
  await page.getByLabel("Password").fill("not the password");
  await page.keyboard.press("Enter");
  await page.getByText("do not belong together").waitFor();
  expect(await page.getByLabel("E-mail").inputValue()).toBe("designer@harrowtide.example");
  expect(await page.getByLabel("Password").inputValue()).toBe("not the password");
  await expectAccessible(page);
});

test("a link cannot lead away from the book after signing in", async () => {
  const { page, at } = await person();
  await page.goto("/sign-in?next=//elsewhere.example/rack");
  await page.getByRole("button", { name: "engineer" }).click();
  await page.getByLabel("Password").fill(DEMO_PASSWORD);
  await page.keyboard.press("Enter");
  await page.waitForURL(at("/rack"));
  expect(page.url()).toBe(at("/rack"));
});

test.each([
  [1440, "light"],
  [768, "dark"],
  [390, "light"],
  [320, "dark"],
] as const)("the sign-in sheet stands at %i px, %s, without violations", async (width, theme) => {
  const { page } = await person({ width, theme });
  await page.goto("/sign-in");
  await page.getByRole("button", { name: "Sign in" }).waitFor();
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
  await picture(page, `sign-in-${width}-${theme}`);
});

test("signing out ends the session", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/rack");
  await page.getByRole("button", { name: "T. Nakamura" }).click();
  await page.getByRole("menuitem", { name: "Sign out" }).click();
  await page.waitForURL("**/sign-in");
  await page.goto("/rack");
  await page.waitForURL("**/sign-in?next=*");
});

test("an address that leads nowhere answers a sheet of our own", async () => {
  const { page, problems } = await person({ as: "designer" });
  await page.goto("/rack/no-such-shape");
  await page.getByRole("heading", { name: "There is no such sheet in this book." }).waitFor();
  await expectAccessible(page);
  // Chromium itself reports the 404 of the page; anything else would be a fault of the sheet.
  expect(problems.splice(0)).toEqual([expect.stringContaining("status of 404")]);
});
