import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { VERBS } from "@/lib/permissions";
import { filesIn, importsOf, ROOT } from "@/tests/helpers/source-files";

const routes = filesIn("app").filter((file) => file.endsWith("route.ts"));
const textOf = (file: string) => readFileSync(join(ROOT, file), "utf8");
const METHODS = /export const (GET|POST|PUT|PATCH|DELETE|HEAD|OPTIONS)\b/g;

/** The one route that asks nobody and nothing: it only says that the process answers. */
const TOUCHES_NOTHING = "app/api/health/route.ts";

test("every route of the application finds its verb in the table", () => {
  expect(routes.length).toBeGreaterThan(20);
  const unknown = routes.flatMap((file) => {
    const text = textOf(file);
    const verbs = [...text.matchAll(/\b(?:openRoute|route)\(\s*"([^"]+)"/g)].map((m) => m[1] ?? "");
    const methods = [...text.matchAll(METHODS)].length;
    const known = verbs.filter((verb) => verb in VERBS).length;
    return file === TOUCHES_NOTHING || (methods > 0 && known === methods)
      ? []
      : [`${file}: ${methods} methods, ${known} verbs`];
  });
  expect(unknown).toEqual([]);
});

test("no route or page reaches past the verbs to the database or lucia", () => {
  const bad = filesIn("app").flatMap((file) =>
    [...importsOf(file), ...importsOf(file, { external: true })]
      .filter((target) => /^db(\/|$)|^drizzle-orm|^@libsql|^lucia$/.test(target))
      .map((target) => `${file} → ${target}`),
  );
  expect(bad).toEqual([]);
});

test("routes hold nothing but parse, one verb, answer: none is longer than 60 lines", () => {
  expect(routes.filter((file) => textOf(file).split("\n").length > 60)).toEqual([]);
});

test("no file of ours is a server action", () => {
  const all = ["app", "components", "lib", "db"].flatMap(filesIn);
  expect(all.filter((file) => /^\s*["']use server["']/m.test(textOf(file)))).toEqual([]);
});
