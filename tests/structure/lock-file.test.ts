import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { ROOT } from "@/tests/helpers/source-files";

type Entry = { version?: string; resolved?: string; integrity?: string; link?: boolean; inBundle?: boolean };
const lock = JSON.parse(readFileSync(join(ROOT, "package-lock.json"), "utf8")) as {
  packages: Record<string, Entry>;
};

/** Oldest versions without a published advisory that concerns this program; nodemailer only once it is used. */
const FLOORS = { next: "16.3.3", react: "19.2.8", "drizzle-orm": "0.45.2", nodemailer: "9.1.0" };

const numbers = (version: string) => version.split("-")[0]!.split(".").map(Number);
const atLeast = (version: string, floor: string): boolean => {
  const [have, want] = [numbers(version), numbers(floor)];
  const first = want.findIndex((part, i) => have[i] !== part);
  return first === -1 || have[first]! > want[first]!;
};

test.each(Object.entries(FLOORS))("%s is locked at %s or later, wherever it is installed", (name, floor) => {
  const found = Object.entries(lock.packages).filter(([path]) => path.endsWith(`node_modules/${name}`));
  if (name !== "nodemailer") expect(found).not.toEqual([]);
  expect(found.filter(([, entry]) => !atLeast(entry.version ?? "0", floor))).toEqual([]);
});

test("a version below its floor is found", () => {
  expect(atLeast("16.3.2", "16.3.3")).toBe(false);
  expect(atLeast("16.10.0", "16.3.3")).toBe(true);
  expect(atLeast("0.45.2", "0.45.2")).toBe(true);
});

test("every locked package has its checksum and none the address it came from", () => {
  const bad = Object.entries(lock.packages)
    .filter(([path, entry]) => path !== "" && !entry.link && !entry.inBundle)
    .filter(([, entry]) => entry.integrity === undefined || entry.resolved !== undefined)
    .map(([path]) => path);
  expect(bad).toEqual([]);
});
