import { expect, test } from "vitest";
import { browserSuite, expectAccessible, expectNoSidewaysScroll, picture } from "@/tests/helpers/browser";

const { person } = browserSuite();
const CSV = "fixtures/csv";

type Someone = Awaited<ReturnType<typeof person>>;

/** Unloads a file into the bay of rolled beams and waits until it has been read. */
async function unload({ page }: Someone, file: string): Promise<void> {
  await page.goto("/goods-in");
  await page.setInputFiles("input[type=file]", file);
  await page.getByRole("combobox", { name: "Into bay" }).selectOption({ label: "1 Rolled beams" });
  await page.getByRole("button", { name: "Unload", exact: true }).click();
  await page.waitForURL(/\/goods-in\/[0-9a-f-]{36}/);
}

test("a librarian takes the European table in as it is: matched, inspected, put away, found on the Rack", async () => {
  const librarian = await person({ as: "librarian" });
  const { page } = librarian;
  await unload(librarian, `${CSV}/stock-eu.csv`);
  await page.getByRole("button", { name: "Put away 65" }).waitFor();
  await expectAccessible(page);
  await picture(page, "goods-in-inspect-eu");
  await page.getByRole("button", { name: /Match columns/ }).click();
  await page.getByText("the file's y–y is our x–x", { exact: false }).first().waitFor();
  await page.getByRole("img", { name: /Section of IPE 100/ }).waitFor();
  await expectAccessible(page);
  await picture(page, "goods-in-columns-eu");
  await page.getByRole("button", { name: "Inspect 65 rows" }).click();
  await page.getByRole("button", { name: "Put away 65" }).click();
  await page.getByRole("link", { name: "See them on the Rack" }).waitFor();
  await picture(page, "goods-in-away-eu");
});

test("the table with defects is decided by keyboard, mended, and what is undecided is left out by name", async () => {
  const librarian = await person({ as: "librarian" });
  const { page } = librarian;
  await unload(librarian, `${CSV}/stock-eu-bad.csv`);
  await page.getByRole("button", { name: /left to decide/ }).waitFor();
  expect(await page.getByRole("button", { name: /left to decide/ }).isDisabled()).toBe(true);

  await page.getByRole("row", { name: /IPE 300/ }).click();
  await page.getByRole("form", { name: "Decide row 6" }).waitFor();
  expect(await page.locator("input[type=radio]:checked").count()).toBe(0);
  await page.keyboard.press("m");
  await page.getByLabel("tw [mm], Web thickness").fill("7,1");
  await page.getByRole("button", { name: "Mend and read again" }).click();
  await page.getByRole("button", { name: /^Put away 1,/ }).waitFor();
  await picture(page, "goods-in-mended");

  await page.getByRole("row", { name: /IPE 200.*digits swapped/ }).click();
  await page.getByRole("form", { name: "Decide row 1" }).waitFor();
  await page.keyboard.press("t");
  await page.getByRole("button", { name: "Decide: say why" }).waitFor();
  await page.getByLabel("Reason, kept with the shape").fill("Printed so by the mill");
  await page.keyboard.press("Enter");
  await page.getByText("tabulated kept").waitFor();
  await expectAccessible(page);
  await picture(page, "goods-in-decided");
  const address = page.url();
  expect(address).toContain("row=");

  await page.getByRole("button", { name: "Leave them out by name" }).click();
  await page.getByRole("link", { name: "See them on the Rack" }).waitFor();
  await page.reload();
  await page
    .getByText(/left out/)
    .first()
    .waitFor();
});

test("a column matched otherwise is read again at once, and the field in hand keeps its focus", async () => {
  const librarian = await person({ as: "librarian" });
  const { page } = librarian;
  await unload(librarian, `${CSV}/stock-us.csv`);
  await page.getByRole("button", { name: /left to decide/ }).waitFor();
  await page.getByRole("button", { name: /Match columns/ }).click();
  const unit = page.getByRole("combobox", { name: /Column 10, Ix .*unit/ });
  await unit.focus();
  await unit.selectOption("cm4");
  await page.getByRole("button", { name: "Read so" }).first().waitFor();
  expect(await unit.evaluate((e) => e === document.activeElement)).toBe(true);
  await page.getByRole("button", { name: "Read so" }).first().click();
  await page.getByRole("button", { name: "Read so" }).waitFor({ state: "detached" });
  await page.getByLabel("Toes of angles not printed").click();
  await page.getByText("Corrected by hand.").waitFor();
  await page.waitForFunction(
    () => document.querySelector('[role="checkbox"][data-state="checked"]') !== null,
  );
  await page.getByLabel("Name, for the next delivery with these headings").fill("Shop tables, inches");
  await page.getByRole("button", { name: "Keep", exact: true }).click();
  await page.getByText("Kept.").waitFor();
  await expectAccessible(page);
  await picture(page, "goods-in-columns-us");
});

test("a file in another encoding is confirmed on its own lines; one that is no table is given back", async () => {
  const librarian = await person({ as: "librarian" });
  const { page } = librarian;
  await page.goto("/goods-in");
  const bytes = Buffer.from(
    "Bezeichnung;Reihe;h [mm];b [mm];tw [mm];tf [mm];r [mm];A [cm2];Bemerkung\nIPE 201;IPE;200;100;5,6;8,5;12;28,48;Tr\u00e4ger\n",
    "latin1",
  );
  await page.setInputFiles("input[type=file]", { name: "alt.csv", mimeType: "text/csv", buffer: bytes });
  await page.getByRole("combobox", { name: "Into bay" }).selectOption({ label: "1 Rolled beams" });
  await page.getByRole("button", { name: "Unload", exact: true }).click();
  await page.getByText("Träger", { exact: false }).waitFor();
  await expectAccessible(page);
  await picture(page, "goods-in-encoding");
  await page.getByRole("button", { name: "Read as Windows-1252" }).click();
  await page.getByRole("button", { name: "Put away 1" }).waitFor();
});

test.each([
  [768, "dark"],
  [390, "light"],
  [320, "dark"],
] as const)(
  "at %i px in the %s theme everything is there and nothing scrolls sideways",
  async (width, theme) => {
    const librarian = await person({ as: "librarian", width, theme, height: width < 400 ? 844 : 1024 });
    const { page } = librarian;
    await page.goto("/goods-in");
    await page.getByText("Bring in a delivery").waitFor();
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
    await picture(page, `goods-in-${width}`);
    await page.getByRole("link", { name: /D-000/ }).first().click();
    await page.getByRole("complementary", { name: "Row in hand" }).waitFor();
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
    await picture(page, `goods-in-inspect-${width}`);
  },
);

test("a designer is told who takes deliveries in", async () => {
  const { page } = await person({ as: "designer" });
  await page.goto("/goods-in");
  await page.getByText("Deliveries are taken in by librarians and admins.").waitFor();
  await expectAccessible(page);
});
