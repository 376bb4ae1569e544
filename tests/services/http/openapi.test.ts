import { readFileSync } from "node:fs";
import { join } from "node:path";
import { Validator } from "@seriousme/openapi-schema-validator";
import { expect, test } from "vitest";
import { OPERATIONS } from "@/lib/http/api-table";
import { openApiDocument } from "@/lib/http/openapi";
import { filesIn, ROOT } from "@/tests/helpers/source-files";

/** "GET /shapes/{id}" with its verb, for every method that a route file exports. */
const routesThereAre = filesIn("app/api/v1")
  .filter((file) => file.endsWith("route.ts"))
  .flatMap((file) => {
    const path = file.replace(/^app\/api\/v1|\/route\.ts$/g, "").replace(/\[(\w+)\]/g, "{$1}");
    const text = readFileSync(join(ROOT, file), "utf8");
    return [...text.matchAll(/export const (\w+) = (?:openRoute|route)\(\s*"([^"]+)"/g)].map(
      ([, method, verb]) => `${method} ${path} ${verb}`,
    );
  });

test("the description holds exactly the routes there are, each with its verb", () => {
  const described = OPERATIONS.map(({ method, path, verb }) => `${method} ${path} ${verb}`);
  expect([...described].sort()).toEqual([...routesThereAre].sort());
});

test("whether a change asks for a version is described as the route asks it", () => {
  for (const { method, path, version = false } of OPERATIONS) {
    const file = `app/api/v1${path.replace(/\{(\w+)\}/g, "[$1]")}/route.ts`;
    const text = readFileSync(join(ROOT, file), "utf8");
    const own =
      text.split(/(?=export const )/).find((part) => part.startsWith(`export const ${method} `)) ?? "";
    const asks = /route\(\s*"[^"]+",\s*\{[^}]*version: true/.test(own);
    expect(`${method} ${path} ${version}`).toBe(`${method} ${path} ${asks}`);
  }
});

test("it is a valid OpenAPI 3.1 document", async () => {
  const { valid, errors } = await new Validator().validate({ ...openApiDocument() });
  expect(JSON.stringify(errors ?? []).slice(0, 2000)).toBe("[]");
  expect(valid).toBe(true);
});

test("schemas are those of the verbs: a required field is required, a number has its range", () => {
  const text = JSON.stringify(openApiDocument());
  expect(text).toContain('"minSx"');
  expect(text).toContain('"quantity":{"type":"integer","minimum":1,"maximum":100000}');
});
