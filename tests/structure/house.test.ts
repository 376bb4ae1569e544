import { readFileSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { filesIn, importsOf, ROOT } from "@/tests/helpers/source-files";

const CODE = ["app", "components", "db", "lib", "tests"];
const sourceOf = (file: string) => readFileSync(join(ROOT, file), "utf8");
const lineCount = (file: string) => sourceOf(file).split("\n").length - 1;

/** At the root stands only what the project's own list names, and what a tool finds nowhere else. */
const TOP_LEVEL = new Set([
  "app",
  "components",
  "lib",
  "db",
  "migrations",
  "public",
  "fixtures",
  "tests",
  "README.md",
  "DEVELOPERS.md",
  "package.json",
  "package-lock.json",
  "tsconfig.json",
  "next.config.ts",
  "postcss.config.mjs",
  "drizzle.config.ts",
  "proxy.ts",
  "instrumentation.ts",
  "instrumentation-client.ts",
]);
const MADE_BY_TOOLS = new Set([
  "node_modules",
  "data",
  "coverage",
  "pictures",
  "next-env.d.ts",
  "test-results",
  "tsconfig.tsbuildinfo",
]);

test("nothing stands at the top level that the house does not name", () => {
  const stray = readdirSync(ROOT).filter(
    (name) => !name.startsWith(".") && !TOP_LEVEL.has(name) && !MADE_BY_TOOLS.has(name),
  );
  expect(stray).toEqual([]);
});

test("pages, layouts and routes reach the database only through verbs", () => {
  const bad = [...filesIn("app"), ...filesIn("components"), ...filesIn("proxy")].flatMap((file) => [
    ...importsOf(file)
      .filter((target) => /^db(\/|$)/.test(target))
      .map((target) => `${file} → ${target}`),
    ...importsOf(file, { external: true })
      .filter((target) => /^(drizzle-orm|@libsql\/|libsql)/.test(target))
      .map((target) => `${file} → ${target}`),
  ]);
  expect(bad).toEqual([]);
});

test("no file offers a server action", () => {
  const bad = CODE.flatMap(filesIn).filter((file) => /^\s*["']use server["']/m.test(sourceOf(file)));
  expect(bad).toEqual([]);
});

test("no file of code is longer than 300 lines", () => {
  const files = CODE.flatMap(filesIn).filter((file) => !file.startsWith("tests/"));
  expect(files.filter((file) => lineCount(file) > 300).map((file) => `${file}: ${lineCount(file)}`)).toEqual(
    [],
  );
});

test("no test is skipped, singled out or compared by digits", () => {
  const banned = /\b(test|it|describe)\.(skip|only|todo)\b|\.toBeCloseTo\b/;
  const bad = filesIn("tests")
    .filter((file) => file !== "tests/structure/house.test.ts")
    .filter((file) => banned.test(sourceOf(file)));
  expect(bad).toEqual([]);
});

test("no file carries a note to do later, a registry's host or a machine's path", () => {
  const marks = ["TO" + "DO", "FIX" + "ME", "X" + "XX", "HA" + "CK"];
  const banned = new RegExp(`\\b(${marks.join("|")})\\b|registry\\.[a-z]+|["'\`(\\s](/work|/root|/home)/`);
  const files = [...CODE.flatMap(filesIn), ...["README.md", "DEVELOPERS.md", "package.json"]];
  const bad = files
    .filter((file) => file !== "tests/structure/house.test.ts")
    .flatMap((file) => {
      const found = banned.exec(sourceOf(file));
      return found ? [`${file}: ${found[0].trim()}`] : [];
    });
  expect(bad).toEqual([]);
});
