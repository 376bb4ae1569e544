import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { afterAll, beforeAll, expect, test, vi } from "vitest";
import type { Browser } from "playwright-core";
import { launchChromium } from "@/tests/helpers/chromium";

let browser: Browser;
let other: Server;

beforeAll(async () => {
  vi.stubEnv("TEST_CHROMIUM", "packaged");
  other = createServer((_request, response) => response.end("secret")).listen(0, "127.0.0.1");
  browser = await launchChromium();
});
afterAll(async () => {
  vi.unstubAllEnvs();
  await browser.close();
  other.close();
});

test("the browser inside the npm package runs and lays text out", async () => {
  const page = await browser.newPage();
  await page.setContent("<h1>Flitch</h1>");
  expect(await page.evaluate(() => document.querySelector("h1")?.textContent)).toBe("Flitch");
});

test("the browser inside the npm package keeps origins apart", async () => {
  const page = await browser.newPage();
  const address = `http://127.0.0.1:${(other.address() as AddressInfo).port}/`;
  const read = page.evaluate((url) => fetch(url).then((answer) => answer.text()), address);
  await expect(read).rejects.toThrow(/fetch/);
});
