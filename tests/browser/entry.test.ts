import { execFile } from "node:child_process";
import { promisify } from "node:util";
import type { Page } from "playwright-core";
import { expect, test } from "vitest";
import type { LetterList } from "@/lib/schemas/letter";
import { clientOf, expectStatus, signedIn } from "@/tests/helpers/api-client";
import { browserSuite, expectAccessible, expectNoSidewaysScroll, picture } from "@/tests/helpers/browser";
import { DEMO_PASSWORD } from "@/tests/helpers/demo-accounts";
import { ROOT } from "@/tests/helpers/source-files";

const { person, server } = browserSuite();
const PASSWORD = "four green trucks at dawn";

/** Address of the page in the newest letter to somebody, read in the mailbox of the demo. */
const linkIn = async (to: string): Promise<string> => {
  const admin = await signedIn(server().url, "admin");
  let text = "";
  await expect
    .poll(
      async () => {
        const { body } = await admin.get<LetterList>("/letters");
        text = body.mailbox?.find((letter) => letter.to === to)?.text ?? "";
        return text;
      },
      { timeout: 20_000, interval: 500 },
    )
    .toContain("token=");
  return /http\S+token=\S+/.exec(text)?.[0] ?? "";
};

const invite = async (email: string): Promise<string> => {
  const admin = await signedIn(server().url, "admin");
  const body = { email, name: "I. Sato", role: "engineer" };
  expectStatus(await admin.send("POST", "/invitations", { body }), 201);
  return linkIn(email);
};

const askForReset = async (email: string): Promise<string> => {
  expectStatus(await clientOf(server().url).send("POST", "/password-resets", { body: { email } }), 202);
  return linkIn(email);
};

const expectSound = async (page: Page, name: string) => {
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
  await picture(page, name);
};

test("an invitation is opened twice, refused in words, accepted once, and the person is in the book", async () => {
  const link = await invite("i.sato@harrowtide.example");
  const { page } = await person();
  await page.goto(link);
  await page.goto(link);
  await page.getByText("At least 15 characters").waitFor();
  await page.getByLabel("New password").fill("too short");
  await page.getByRole("button", { name: "Accept" }).click();
  await page.getByRole("alert").getByText("has 9 characters; it needs at least 15").waitFor();
  expect(await page.getByLabel("New password").inputValue()).toBe("too short");
  await expectSound(page, "invitation-refused");
  await page.getByLabel("New password").fill("passwordpassword");
  await page.keyboard.press("Enter");
  await page.getByRole("alert").getByText("too easy to guess").waitFor();
  await page.getByLabel("Name").fill("Ida Sato");
  await page.getByLabel("New password").fill(PASSWORD);
  await page.keyboard.press("Enter");
  await page.waitForURL("**/rack");
  await page.getByRole("button", { name: "Ida Sato" }).waitFor();
  await page.goto(link);
  await page.getByText("This link does not hold").waitFor();
  await expectSound(page, "invitation-over");
});

test("a forgotten password: the letter is asked for, its link sets a new one, once", async () => {
  const email = "designer@harrowtide.example";
  const { page } = await person();
  await page.goto("/sign-in");
  await page.getByRole("link", { name: "Forgotten password" }).click();
  await page.waitForURL("**/password-reset");
  await page.getByRole("button", { name: "Send the letter" }).click();
  await page.getByRole("alert").getByText("The e-mail address is missing.").waitFor();
  await page.getByLabel("E-mail").fill(email);
  await page.keyboard.press("Enter");
  await page.getByText(`If ${email} has an account, a letter is on its way`).waitFor();
  await expectSound(page, "reset-asked");
  const link = await linkIn(email);
  await page.goto(link);
  await page.goto(link);
  expectStatus(
    await clientOf(server().url).send("POST", "/session", { body: { email, password: DEMO_PASSWORD } }),
    201,
  );
  await page.getByLabel("New password").fill(PASSWORD);
  await page.keyboard.press("Enter");
  await page.getByRole("link", { name: "Sign in with it" }).click();
  await page.waitForURL("**/sign-in");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password").fill(PASSWORD);
  await page.keyboard.press("Enter");
  await page.waitForURL("**/rack");
  await page.goto(link);
  await page.getByLabel("New password").fill(PASSWORD);
  await page.keyboard.press("Enter");
  await page.getByRole("alert").getByText("This link does not hold").waitFor();
  expect(await page.getByLabel("New password").inputValue()).toBe(PASSWORD);
  await page.getByRole("alert").getByRole("link", { name: "Ask for a new letter" }).waitFor();
  await expectSound(page, "reset-over");
});

test.each([
  [1440, "light"],
  [390, "dark"],
] as const)("the sheets of both letters stand at %i px, %s, without violations", async (width, theme) => {
  const { page } = await person({ width, theme });
  await page.goto(await invite(`n.person${width}@harrowtide.example`));
  await page.getByRole("button", { name: "Accept" }).waitFor();
  await expectSound(page, `invitation-${width}`);
  await page.goto(await askForReset("engineer@harrowtide.example"));
  await page.getByRole("button", { name: "Set the password" }).waitFor();
  await expectSound(page, `reset-${width}`);
  await page.goto("/password-reset");
  await page.getByRole("button", { name: "Send the letter" }).waitFor();
  await expectSound(page, `ask-${width}`);
});

test("somebody of another firm is told so, accepts with the password they have, and lands in the new firm", async () => {
  const email = "m.ferry@otherworks.example";
  const made = await promisify(execFile)(
    process.execPath,
    [
      ...["--conditions=react-server", "--import", "tsx", "lib/commands/admin.ts", "create"],
      ...["--organisation", "Other Works", "--email", email, "--name", "M. Ferry"],
    ],
    { cwd: ROOT, env: { ...process.env, DATABASE_URL: `file:${server().databaseFile}` } },
  );
  const own = /password (\S+) \(shown/.exec(made.stdout)?.[1] ?? "";
  const { page } = await person();
  await page.goto(await invite(email));
  await page.getByText("You have an account with this address already.").waitFor();
  await page.getByLabel("Password of your account").fill("not my password");
  await page.keyboard.press("Enter");
  await page.getByRole("alert").getByText("give the password you have").waitFor();
  expect(await page.getByLabel("Password of your account").inputValue()).toBe("not my password");
  await expectSound(page, "invitation-known");
  await page.getByLabel("Password of your account").fill(own);
  await page.keyboard.press("Enter");
  await page.waitForURL("**/rack");
  const me = await page.request.get("/api/v1/me");
  expect(await me.json()).toMatchObject({
    organisation: { name: "Harrow & Tide Fabrication" },
    role: "engineer",
  });
});
