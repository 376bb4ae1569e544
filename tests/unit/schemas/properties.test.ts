import { getTableColumns } from "drizzle-orm";
import { expect, expectTypeOf, test } from "vitest";
import { figures } from "@/db/schema/figures";
import type { Properties } from "@/lib/schemas/properties";
import { Properties as PropertiesSchema } from "@/lib/schemas/properties";
import type { SectionProperties } from "@/lib/section/properties";
import { columnOf, PROPERTY_KEYS, scalarsOf } from "@/lib/services/shape/figure-values";
import { rectangleProperties } from "@/tests/helpers/rectangle-properties";

test("the properties on the wire are those of the engine", () => {
  expectTypeOf<SectionProperties>().toExtend<Properties>();
  expectTypeOf<Properties>().toExtend<SectionProperties>();
  expect(PropertiesSchema.parse(rectangleProperties(10, 30))).toEqual(rectangleProperties(10, 30));
});

test("figures have one column for every property key, named after it", () => {
  const columns = getTableColumns(figures);
  for (const key of PROPERTY_KEYS) expect(columns[key]?.name, key).toBe(columnOf(key));
  const others = ["revisionId", "organisationId", "source", "engineVersion", "rest"];
  expect(Object.keys(columns).sort()).toEqual([...PROPERTY_KEYS, ...others].sort());
});

test("every scalar is found under its key, nested ones too", () => {
  const scalars = scalarsOf(rectangleProperties(10, 30));
  expect(scalars["extents.yMax"]).toBe(15);
  expect(scalars["perimeter.outer"]).toBe(80);
  expect(scalars.J).toBeNull();
  expect(scalars["shearCentre.x"]).toBeNull();
});
