import { expect, test } from "vitest";
import type { Page } from "playwright-core";
import { browserSuite, expectAccessible, picture, type Person } from "@/tests/helpers/browser";
import { DEMO_PASSWORD, type DemoAccount } from "@/tests/helpers/demo-accounts";
import { girderDrawing, GIRDER_FIGURES } from "@/tests/helpers/main-job-girder";

const { person } = browserSuite();
const DESIGNATION = "PG 0500-9";

/** Comes in by the front door, and to the page asked for. */
const comeIn = async (account: DemoAccount, path: string): Promise<Person> => {
  const someone = await person();
  const { page } = someone;
  await page.goto(path);
  await page.waitForURL("**/sign-in*");
  await page.getByLabel("E-mail").fill(`${account}@harrowtide.example`);
  await page.getByLabel("Password").fill(DEMO_PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL(`**${path}`);
  return someone;
};

const typeGirder = async (page: Page) => {
  const row = page.locator("[data-add-row]");
  await row.waitFor();
  for (const text of ["180x12", "8x476", "180x12"]) {
    await row.fill(text);
    await row.press("Enter");
  }
};

/** A figure of the Bench's panel as a bare number, by the name of its row. */
const figure = async (page: Page, name: string) =>
  Number(
    (
      await page
        .getByRole("row", { name: new RegExp(`^${name}`) })
        .first()
        .locator(".figure")
        .first()
        .textContent()
    )?.replace(/[^\d.]/g, ""),
  );

const draftIn = (someone: Person, bayId: string, designation: string) =>
  someone.context.request.post(someone.at("/api/v1/shapes"), {
    headers: { origin: someone.at("") },
    data: { bayId, family: "plate-girder", designation, drawing: girderDrawing() },
  });

test("four people do the main job: type a girder, take in stock, release, find the lightest, raise a right", async () => {
  const engineer = await comeIn("engineer", "/bench");
  await typeGirder(engineer.page);
  const ixMillions = GIRDER_FIGURES.Ix / 1e6;
  await expect
    .poll(async () => Math.abs((await figure(engineer.page, "Second moment of area")) - ixMillions))
    .toBeLessThan(0.06);
  await engineer.page.waitForURL(/\/bench\/[0-9a-f-]{36}$/);
  await engineer.page.getByRole("button", { name: "Save into a bay" }).click();
  await engineer.page.getByRole("combobox", { name: "Bay" }).selectOption({ label: "4 Plate girders" });
  await engineer.page.getByRole("textbox", { name: "Designation" }).fill(DESIGNATION);
  await picture(engineer.page, "main-job-1-save");
  await engineer.page.getByRole("textbox", { name: "Designation" }).press("Enter");
  await engineer.page.getByRole("button", { name: "Submit for release" }).click();
  await engineer.page.getByText("submitted", { exact: true }).first().waitFor();
  await picture(engineer.page, "main-job-1-bench");

  const librarian = await comeIn("librarian", "/goods-in");
  const stock = librarian.page;
  await stock.setInputFiles("input[type=file]", "fixtures/csv/stock-eu.csv");
  await stock.getByRole("combobox", { name: "Into bay" }).selectOption({ label: "1 Rolled beams" });
  await stock.getByRole("button", { name: "Unload", exact: true }).click();
  await stock.getByRole("button", { name: "Put away 65" }).click();
  await stock.getByRole("link", { name: "See them on the Rack" }).waitFor();
  await picture(stock, "main-job-2-goods-in");

  const found = await librarian.context.request.get(
    librarian.at(`/api/v1/shapes?state=submitted&q=${encodeURIComponent(DESIGNATION)}`),
  );
  const { items } = (await found.json()) as { items: { id: string; bayId?: string }[] };
  const sheet = `/rack/${items[0]?.id}`;
  await stock.goto(sheet);
  await stock.getByRole("button", { name: "Check revision A" }).click();
  await stock.getByRole("radio", { name: "hand check" }).click();
  await stock.getByRole("button", { name: "Record the check" }).click();
  await stock.getByRole("button", { name: "Release", exact: true }).click();
  await stock.getByText("released", { exact: true }).first().waitFor();
  await picture(stock, "main-job-2-released");

  const designer = await comeIn("designer", "/rack");
  const rack = designer.page;
  await rack.getByRole("textbox", { name: "Min S x" }).fill("1300 cm3");
  await rack.keyboard.press("Enter");
  await rack.waitForURL("**minSx=1300000**");
  await rack.getByRole("textbox", { name: "Min I x" }).fill("300");
  await rack.keyboard.press("Enter");
  await rack.waitForURL("**minIx=300000000**");
  const rows = rack.getByRole("grid", { name: "Shapes" }).locator("tr[data-row]");
  await rows.filter({ hasText: DESIGNATION }).waitFor();
  const shown = await rows.locator("td:nth-child(6)").allInnerTexts();
  const masses = shown.map((text) => Number(text.replace(/\s/g, "")));
  expect(masses).toEqual([...masses].sort((a, b) => a - b));
  const names = (await rows.locator("td:nth-child(2)").allInnerTexts()).map((text) => text.trim());
  expect(names.some((name) => name.startsWith("IPE"))).toBe(true);
  await picture(rack, "main-job-3-rack");
  await rows.filter({ hasText: DESIGNATION }).click();
  await rack.keyboard.press("Enter");
  await rack.waitForURL(`**${sheet}*`);
  await rack
    .getByRole("heading", { level: 1, name: `${DESIGNATION}, revision A` })
    .waitFor({ state: "attached" });
  await rack
    .getByRole("img", { name: new RegExp(DESIGNATION) })
    .first()
    .waitFor();
  await expectAccessible(rack);
  await picture(rack, "main-job-3-sheet");

  const admin = await comeIn("admin", sheet);
  await admin.page
    .getByRole("heading", { level: 1, name: `${DESIGNATION}, revision A` })
    .waitFor({ state: "attached" });
  const bays = (await (await admin.context.request.get(admin.at("/api/v1/bays"))).json()) as {
    items: { id: string; name: string }[];
  };
  const crane = bays.items.find(({ name }) => name === "Crane girders")?.id ?? "";
  expect((await draftIn(designer, crane, "CG 0500-T")).status()).toBe(403);
  await admin.page.goto("/office");
  await admin.page.getByRole("button", { name: /^T\. Nakamura, Crane girders:/ }).click();
  await admin.page
    .getByRole("dialog", { name: "Right of T. Nakamura in Crane girders" })
    .getByRole("button", { name: /draft and submit/ })
    .click();
  await admin.page
    .getByRole("button", { name: "T. Nakamura, Crane girders: draft and submit, granted" })
    .waitFor();
  expect((await draftIn(designer, crane, "CG 0500-T")).status()).toBe(201);
  await picture(admin.page, "main-job-4-office");
});
