import { sectionOf } from "@/lib/drawing/section-of";
import type { Point, Region, Vertex } from "@/lib/geometry/region";
import type { Section } from "@/lib/section/section";
import { dimension, type CheckRow } from "@/tests/reference/check-rows";
import { drawingOfRow } from "@/tests/reference/drawing-of-row";
import { rectangleAt, sectionOfRegions } from "@/tests/helpers/sections";

const solid = (...outer: readonly Vertex[]): Region => ({ outer, holes: [] });
const hole = (x0: number, y0: number, x1: number, y1: number): readonly Point[] => [
  { x: x0, y: y0 },
  { x: x0, y: y1 },
  { x: x1, y: y1 },
  { x: x1, y: y0 },
];

/** A strip of thickness t along an arc of radius r about the origin, from −half to half of the angle, radians. */
const arcStrip = (r: number, t: number, half: number): Region => {
  const at = (radius: number, angle: number) => ({
    x: radius * Math.cos(angle),
    y: radius * Math.sin(angle),
  });
  const bulge = Math.tan(half / 4);
  const [outer, inner] = [r + t / 2, r - t / 2];
  return solid(
    { ...at(outer, -half), bulge },
    { ...at(outer, 0), bulge },
    at(outer, half),
    { ...at(inner, half), bulge: -bulge },
    { ...at(inner, 0), bulge: -bulge },
    at(inner, -half),
  );
};

/** Sections told by their middle lines: b, h between middle lines, t the thickness. */
const thin = (row: CheckRow): Region | null => {
  const d = (key: string) => dimension(row, key);
  switch (row.shape) {
    case "thin channel": {
      const [b, h, t] = [d("b"), d("h"), d("t")];
      const [web, foot, top] = [t / 2, t / 2, h + t / 2];
      return solid(
        { x: -web, y: -foot },
        { x: b, y: -foot },
        { x: b, y: foot },
        { x: web, y: foot },
        { x: web, y: h - foot },
        { x: b, y: h - foot },
        { x: b, y: top },
        { x: -web, y: top },
      );
    }
    case "thin Z": {
      const [b, h, t] = [d("b"), d("h"), d("t")];
      const half = t / 2;
      return solid(
        { x: -b, y: -half },
        { x: half, y: -half },
        { x: half, y: h - half },
        { x: b, y: h - half },
        { x: b, y: h + half },
        { x: -half, y: h + half },
        { x: -half, y: half },
        { x: -b, y: half },
      );
    }
    case "circular tube with a slit":
      return arcStrip(d("r"), d("t"), Math.PI - d("t") / 1000 / d("r"));
    case "thin semicircular arc":
      return arcStrip(d("r"), d("t"), Math.PI / 2);
    case "rectangle":
      return typeof row.dims["t"] === "number" ? rectangleAt(0, 0, d("b") * 100, d("t") * 100) : null;
    default:
      break;
  }
  if (row.shape.startsWith("box")) {
    const [b, h, t] = [d("b"), d("h"), d("t")];
    const half = t / 2;
    return {
      outer: rectangleAt(-half, -half, b + t, h + t).outer,
      holes: [hole(half, half, b - half, h - half)],
    };
  }
  if (row.shape.startsWith("two-cell box")) {
    const [b, h, x, t] = [d("b"), d("h"), d("x"), d("t")];
    const half = t / 2;
    return {
      outer: rectangleAt(-half, -half, b + t, h + t).outer,
      holes: [hole(half, half, x - half, h - half), hole(x + half, half, b - half, h - half)],
    };
  }
  return null;
};

/** The section whose torsion a row tells, or null where the row tells none that can be drawn. */
export const torsionSectionOfRow = (row: CheckRow): Section | null => {
  const region = thin(row);
  if (region !== null) return sectionOfRegions([region]);
  const drawing = drawingOfRow(row);
  if (drawing === null) return null;
  const section = sectionOf(drawing);
  if (!section.ok) throw new Error(`${row.id}: ${JSON.stringify(section.error)}`);
  return section.value;
};
