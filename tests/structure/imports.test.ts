import { expect, test } from "vitest";
import { filesIn, importsOf } from "@/tests/helpers/source-files";

const PURE = ["units", "geometry", "section", "profiles", "drawing", "figure"];
const BASE = ["lib/result", "lib/errors"];
const TO_DRAWING = ["units", "geometry", "section", "profiles", "drawing"].map((f) => `lib/${f}`);
const PURE_ALL = [...PURE, "beam", "makeup", "intake", "export"].map((f) => `lib/${f}`);
const SERVER_CHAIN = ["lib/auth", "lib/mail", "lib/services", "lib/http"];
const SCHEMAS = [...BASE, "lib/env", ...PURE_ALL, "lib/schemas", "lib/permissions"];
const LIB_BROWSER = [...BASE, ...PURE_ALL, "lib/schemas", "lib/permissions", "lib/client"];

/** folder → what of ours it may import (itself always); type imports count. */
const TABLE: Record<string, readonly string[]> = {
  "lib/result": [],
  "lib/errors": ["lib/result"],
  "lib/env": ["lib/result", "lib/errors"],
  "lib/logger": ["lib/env"],
  ...Object.fromEntries(
    PURE.map((f, i) => [`lib/${f}`, [...BASE, ...PURE.slice(0, i).map((g) => `lib/${g}`)]]),
  ),
  "lib/beam": [...BASE, ...TO_DRAWING],
  "lib/makeup": [...BASE, ...TO_DRAWING],
  "lib/intake": [...BASE, ...TO_DRAWING],
  "lib/export": [...BASE, ...PURE_ALL],
  "lib/schemas": [...BASE, "lib/env", ...PURE_ALL],
  "lib/permissions": [...BASE, "lib/env", ...PURE_ALL, "lib/schemas"],
  db: ["lib/schemas", "lib/errors", "lib/result", "lib/permissions", "lib/env"],
  ...Object.fromEntries(
    SERVER_CHAIN.map((f, i) => [f, [...SCHEMAS, "db", "lib/logger", ...SERVER_CHAIN.slice(0, i)]]),
  ),
  "lib/demo": ["lib", "db"],
  "lib/commands": ["lib", "db"],
  "lib/start": [],
  "lib/client": LIB_BROWSER,
  components: [...LIB_BROWSER, "components"],
};

const within = (path: string, folder: string) => path === folder || path.startsWith(`${folder}/`);

test.each(Object.entries(TABLE))("%s imports only what its row of the table allows", (folder, allowed) => {
  const bad = filesIn(folder).flatMap((file) =>
    importsOf(file)
      .filter((target) => !within(target, folder) && !allowed.some((a) => within(target, a)))
      .map((target) => `${file} → ${target}`),
  );
  expect(bad).toEqual([]);
});

test("every folder of lib stands in the table", () => {
  const folders = new Set(
    filesIn("lib").map((f) =>
      f
        .split("/")
        .slice(0, 2)
        .join("/")
        .replace(/\.tsx?$/, ""),
    ),
  );
  expect([...folders].filter((f) => !(f in TABLE))).toEqual([]);
});

test("the pure folders reach neither the framework, the database nor Node", () => {
  const PURE_FOLDERS = [...PURE_ALL, "lib/schemas", "lib/permissions", "lib/result", "lib/errors"];
  const banned = /^(node:|react|next|drizzle-orm|@libsql|konva|server-only|fs$|path$|lucia)/;
  const bad = PURE_FOLDERS.flatMap((folder) =>
    filesIn(folder).flatMap((file) =>
      importsOf(file, { external: true })
        .filter((target) => banned.test(target))
        .map((target) => `${file} → ${target}`),
    ),
  );
  expect(bad).toEqual([]);
});

test("no file is a barrel", () => {
  const all = ["lib", "components", "app", "db"].flatMap(filesIn);
  expect(all.filter((file) => /(^|\/)index\.tsx?$/.test(file))).toEqual([]);
});
