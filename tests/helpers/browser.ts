import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { AxeBuilder } from "@axe-core/playwright";
import type { Browser, BrowserContext, Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect } from "vitest";
import { DEMO_PASSWORD, type DemoAccount } from "@/tests/helpers/demo-accounts";
import { launchChromium } from "@/tests/helpers/chromium";
import { startServer, type BuiltServer, type ServerOptions } from "@/tests/helpers/server";
import { ROOT } from "@/tests/helpers/source-files";

export type Person = Readonly<{
  page: Page;
  context: BrowserContext;
  /** Console errors, uncaught exceptions, policy violations and answers of 500 and above so far. */
  problems: string[];
  /** Address of a path on the server under test. */
  at: (path: string) => string;
}>;

export type PersonOptions = Readonly<{
  /** Signed in through the API before the first page; nobody when left out. */
  as?: DemoAccount | { email: string; password: string };
  width?: 1440 | 1280 | 768 | 390 | 320;
  height?: number;
  theme?: "light" | "dark";
}>;

/** Chromium itself writes an error for every refused request; a 4xx of the API is an answer, not a fault of the page. */
const isRefusedRequest = (text: string, url: string) =>
  /^Failed to load resource: .* status of 4\d\d/.test(text) && url.includes("/api/v1/");

const watch = async (context: BrowserContext, problems: string[]) => {
  await context.exposeBinding("flitchbookViolation", (_source, text: string) => problems.push(text));
  await context.addInitScript(() => {
    document.addEventListener("securitypolicyviolation", (event) => {
      const report = (window as unknown as { flitchbookViolation: (text: string) => void })
        .flitchbookViolation;
      report(
        `policy violation: ${event.violatedDirective} ${event.blockedURI} ${event.sourceFile}:${event.lineNumber}`,
      );
    });
  });
  context.on("console", (message) => {
    if (message.type() !== "error" || isRefusedRequest(message.text(), message.location().url)) return;
    problems.push(`console: ${message.text()} (${message.location().url})`);
  });
  context.on("weberror", (error) =>
    problems.push(`uncaught: ${error.error().stack ?? error.error().message}`),
  );
  context.on("response", (response) => {
    if (response.status() >= 500) problems.push(`${response.status()} from ${response.url()}`);
  });
};

const signIn = async (context: BrowserContext, url: string, as: NonNullable<PersonOptions["as"]>) => {
  const data = typeof as === "string" ? { email: `${as}@harrowtide.example`, password: DEMO_PASSWORD } : as;
  const answer = await context.request.post(`${url}/api/v1/session`, { data, headers: { Origin: url } });
  if (!answer.ok()) throw new Error(`Sign-in of ${data.email}: ${answer.status()} ${await answer.text()}`);
};

/**
 * One server and one Chromium for the calling test file. Every person gets a fresh context (cookies, storage);
 * after each test the contexts are closed and the test fails when any of them had a problem.
 */
export const browserSuite = (options: ServerOptions = {}) => {
  let server: BuiltServer | undefined;
  let browser: Browser | undefined;
  const people: Person[] = [];

  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(options), launchChromium()]);
  });
  afterEach(async () => {
    const problems = people.flatMap((person) => person.problems);
    await Promise.all(people.splice(0).map(({ context }) => context.close()));
    expect(problems).toEqual([]);
  });
  afterAll(async () => {
    await browser?.close();
    await server?.stop();
  });

  const person = async ({
    as,
    width = 1440,
    height = 900,
    theme = "light",
  }: PersonOptions = {}): Promise<Person> => {
    const { url } = server!;
    const context = await browser!.newContext({
      baseURL: url,
      viewport: { width, height },
      colorScheme: theme,
      locale: "en-GB",
      timezoneId: "UTC",
      reducedMotion: "reduce",
      hasTouch: width < 820,
    });
    context.setDefaultTimeout(20_000);
    const problems: string[] = [];
    await watch(context, problems);
    if (as) await signIn(context, url, as);
    const someone = {
      context,
      page: await context.newPage(),
      problems,
      at: (path: string) => `${url}${path}`,
    };
    people.push(someone);
    return someone;
  };

  return { person, server: () => server! };
};

/** Fails on any axe violation of WCAG 2.0 to 2.2, level A and AA. */
export const expectAccessible = async (page: Page): Promise<void> => {
  const tags = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"];
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  const told = violations.flatMap(({ id, help, nodes }) =>
    nodes.map((node) => `${id}: ${help}: ${node.target.join(" ")} — ${node.failureSummary ?? ""}`),
  );
  expect(told).toEqual([]);
};

/** Fails when the page scrolls sideways. */
export const expectNoSidewaysScroll = async (page: Page): Promise<void> => {
  const { scrollWidth, clientWidth } = await page.evaluate(() => ({
    scrollWidth: document.documentElement.scrollWidth,
    clientWidth: document.documentElement.clientWidth,
  }));
  expect(scrollWidth, `page is ${scrollWidth} px wide in a window of ${clientWidth} px`).toBeLessThanOrEqual(
    clientWidth,
  );
};

/** Writes `pictures/<name>.png` (a folder outside version control) and answers its path. */
export const picture = async (page: Page, name: string): Promise<string> => {
  const folder = join(ROOT, "pictures");
  mkdirSync(folder, { recursive: true });
  const path = join(folder, `${name}.png`);
  await page.screenshot({ path });
  return path;
};
