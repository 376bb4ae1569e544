import { existsSync, mkdirSync, readFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { chromium, type Browser } from "playwright-core";
import { ROOT } from "@/tests/helpers/source-files";

const INSTALLED = [
  "/usr/bin/chromium",
  "/usr/bin/chromium-browser",
  "/usr/bin/google-chrome",
  "/snap/bin/chromium",
];

/** Web security stays on, unlike in the flags the packaged browser brings along. */
const FLAGS = [
  "--headless",
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

type Executable = Readonly<{ path: string; env: Record<string, string | undefined> }>;

/** The browser that ships inside the npm package, unpacked into a temporary folder of its own version. */
const packagedChromium = async (): Promise<Executable> => {
  const { version } = JSON.parse(
    readFileSync(join(ROOT, "node_modules/@sparticuz/chromium/package.json"), "utf8"),
  ) as { version: string };
  const before = { ...process.env };
  const folder = join(tmpdir(), `flitchbook-chromium-${version}`);
  mkdirSync(folder, { recursive: true });
  // Read by the package at import: where it unpacks, and that its own system libraries are wanted.
  process.env.TMPDIR = folder;
  process.env.AWS_LAMBDA_JS_RUNTIME = "nodejs20.x";
  try {
    const { default: packaged } = await import("@sparticuz/chromium");
    const path = await packaged.executablePath();
    const env = {
      ...before,
      LD_LIBRARY_PATH: join(folder, "al2023", "lib"),
      FONTCONFIG_PATH: join(folder, "fonts"),
    };
    return { path, env };
  } finally {
    for (const key of Object.keys(process.env)) if (!(key in before)) delete process.env[key];
    Object.assign(process.env, before);
  }
};

const executable = async (): Promise<Executable> => {
  const asked = process.env.TEST_CHROMIUM;
  if (asked === "packaged") return packagedChromium();
  const path = asked ?? INSTALLED.find((candidate) => existsSync(candidate));
  return path === undefined ? packagedChromium() : { path, env: process.env };
};

/** Starts real Chromium: an installed one, else the one of the npm package; TEST_CHROMIUM=packaged or a path decides. */
export const launchChromium = async (): Promise<Browser> => {
  const { path, env } = await executable();
  const given = Object.fromEntries(
    Object.entries(env).filter((entry): entry is [string, string] => entry[1] !== undefined),
  );
  return chromium.launch({ executablePath: path, args: FLAGS, env: given, chromiumSandbox: false });
};
