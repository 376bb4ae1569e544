import { expect, test } from "vitest";
import { fieldBands } from "@/lib/figure/field-bands";
import { expectRel } from "@/tests/helpers/expect-rel";
import { rectangleAt, sectionOfRegions } from "@/tests/helpers/sections";
import { connectedTorsion } from "@/tests/helpers/torsion";

const { fields } = connectedTorsion(sectionOfRegions([rectangleAt(10, 20, 100, 200)]), { fields: true });
const picture = fieldBands(fields!, "shearY", 8);

test("every piece of the mesh stands in one band", () => {
  const pieces = picture.bands.reduce((sum, { path }) => sum + path.split("Z").length - 1, 0);
  expect(pieces).toBe(fields!.triangles.length / 3);
});

test("the bands run from nothing to the greatest stress, 1.5 V/A in the middle of a rectangle", () => {
  expect(picture.bands[0]!.from).toBe(0);
  expectRel(picture.bands[7]!.to, picture.greatest.value, { rel: 1e-12 });
  expectRel(picture.greatest.value, 1.5 / 20_000, { rel: 1e-4 });
  expectRel(picture.greatest.at.y, 120, { rel: 0.02 });
});

test("the box is that of the section with y down", () => {
  expect(picture.box).toEqual({ x: 10, y: -220, width: 100, height: 200 });
});

test("the ends carry little and the middle much", () => {
  const rows = (path: string) => [...path.matchAll(/M\S+ (\S+)L/g)].map((m) => Number(m[1]));
  for (const y of rows(picture.bands[7]!.path)) expect(Math.abs(-y - 120)).toBeLessThan(60);
  for (const y of rows(picture.bands[0]!.path)) expect(Math.abs(-y - 120)).toBeGreaterThan(60);
});
