import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { filesIn, ROOT } from "@/tests/helpers/source-files";

const built = (file: string): unknown => JSON.parse(readFileSync(join(ROOT, ".next", file), "utf8"));

test("the build offers no server action", () => {
  const manifest = built("server/server-reference-manifest.json") as Record<string, unknown>;
  expect(manifest).toMatchObject({ node: {}, edge: {} });
  expect(Object.keys(manifest.node as object)).toEqual([]);
  expect(Object.keys(manifest.edge as object)).toEqual([]);
});

test("the build has a page or route for every page and route of the sources, and no other of ours", () => {
  const paths = Object.values(built("app-path-routes-manifest.json") as Record<string, string>);
  const ours = filesIn("app")
    .filter((file) => /\/(page\.tsx|route\.ts)$/.test(file))
    .map((file) =>
      file
        .replace(/^app/, "")
        .replace(/\/(page\.tsx|route\.ts)$/, "")
        .replace(/\/\([^/]+\)/g, ""),
    )
    .map((path) => path || "/");
  const framework = new Set(["/_not-found", "/_global-error"]);
  expect(paths.filter((path) => !framework.has(path)).sort()).toEqual(ours.sort());
});

test("every page of the desk asks for the actor itself", () => {
  const pages = filesIn("app").filter((file) => /^app\/\(desk\)\/.*\/page\.tsx$/.test(file));
  expect(pages).not.toEqual([]);
  const silent = pages.filter((file) => !/await pageContext\(/.test(readFileSync(join(ROOT, file), "utf8")));
  expect(silent).toEqual([]);
});
