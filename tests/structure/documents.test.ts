import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import { ROOT } from "@/tests/helpers/source-files";

const { scripts } = JSON.parse(readFileSync(join(ROOT, "package.json"), "utf8")) as {
  scripts: Record<string, string>;
};
const FOLDERS = "app|components|db|fixtures|lib|migrations|public|tests";
const ABSENT_IS_FINE = /[<>*…]/;

describe.each(["README.md", "DEVELOPERS.md"])("%s", (document) => {
  const text = readFileSync(join(ROOT, document), "utf8");

  test("quotes only paths that exist", () => {
    const quoted = [...text.matchAll(new RegExp("`((?:" + FOLDERS + ")/[^`\\s]*)`", "g"))].map((m) => m[1]!);
    const missing = quoted
      .filter((path) => !ABSENT_IS_FINE.test(path))
      .filter((path) => !existsSync(join(ROOT, path)));
    expect(missing).toEqual([]);
  });

  test("names only npm scripts that exist", () => {
    const named = [...text.matchAll(/(?:^|`)npm (?:run )?([a-z][a-z:-]*)/gm)].map((m) => m[1]!);
    const builtIn = new Set(["ci", "install", "exec"]);
    expect(named.filter((name) => !(name in scripts) && !builtIn.has(name))).toEqual([]);
  });
});
