import type { Drawing, PartShape } from "@/lib/drawing/schema";
import type { Vertex } from "@/lib/geometry/region";
import type { Profile } from "@/lib/profiles/families";
import { steelDrawing, profileDrawing } from "@/tests/helpers/steel-drawing";
import { dimension, type CheckRow } from "@/tests/reference/check-rows";

const outline = (outer: readonly Vertex[]): Drawing =>
  steelDrawing({ shape: { kind: "outline", outer: [...outer], holes: [] } });

const plate = (width: number, height: number): PartShape => ({ kind: "plate", width, height });

/** Edges to an ellipse drawn as arcs: their error falls as 1/n⁴ and is below 1e-10 here. */
const ELLIPSE_ARCS = 720;

/** An ellipse as arcs, each through three points of it: the ends and the one between them. */
const ellipse = (a: number, b: number): Drawing => {
  const at = (i: number) => {
    const t = (2 * Math.PI * i) / ELLIPSE_ARCS;
    return { x: a * Math.cos(t), y: b * Math.sin(t) };
  };
  return outline(
    Array.from({ length: ELLIPSE_ARCS }, (_, i) => {
      const [from, middle, to] = [at(i), at(i + 0.5), at(i + 1)];
      const chord = Math.hypot(to.x - from.x, to.y - from.y);
      const height = ((to.x - from.x) * (from.y - middle.y) - (from.x - middle.x) * (to.y - from.y)) / chord;
      return { ...from, bulge: height / (chord / 2) };
    }),
  );
};

type Dim = (key: string) => number;

const profileOf = (row: CheckRow, d: Dim): Profile | null => {
  switch (row.shape) {
    case "I rolled, fillet r":
      return {
        family: "i-section",
        dimensions: {
          depth: d("h"),
          flangeWidth: d("b"),
          webThickness: d("tw"),
          flangeThickness: d("tf"),
          rootRadius: d("r"),
        },
      };
    case "W shape":
      return {
        family: "i-section",
        dimensions: {
          depth: d("d"),
          flangeWidth: d("bf"),
          webThickness: d("tw"),
          flangeThickness: d("tf"),
          rootRadius: d("kdes") - d("tf"),
        },
      };
    case "channel, tapered flanges":
      return {
        family: "channel",
        dimensions: {
          depth: d("h"),
          flangeWidth: d("b"),
          webThickness: d("tw"),
          flangeThickness: d("tf"),
          rootRadius: d("r1"),
          toeRadius: d("r2"),
          flangeSlope: Number(row.dims["slope"]),
        },
      };
    case "channel, parallel flanges":
      return {
        family: "channel",
        dimensions: {
          depth: d("h"),
          flangeWidth: d("b"),
          webThickness: d("tw"),
          flangeThickness: d("tf"),
          rootRadius: d("r"),
        },
      };
    case "C shape":
      return {
        family: "channel",
        dimensions: {
          depth: d("d"),
          flangeWidth: d("bf"),
          webThickness: d("tw"),
          flangeThickness: d("tf"),
          rootRadius: d("rFilletAssumed"),
          toeRadius: d("rToeAssumed"),
          flangeSlope: 2 / 12,
          thicknessAt: (d("bf") + d("tw")) / 2,
        },
      };
    case "angle equal":
    case "angle unequal":
      return {
        family: "angle",
        dimensions: {
          legLong: d("a"),
          legShort: d("b"),
          thickness: d("t"),
          rootRadius: d("r1"),
          toeRadius: d("r2"),
        },
      };
    case "L shape":
      return {
        family: "angle",
        dimensions: {
          legLong: d("d"),
          legShort: d("b"),
          thickness: d("t"),
          rootRadius: d("kdes") - d("t"),
          toeRadius: 0,
        },
      };
    case "SHS hot finished":
    case "SHS cold formed":
    case "RHS cold formed":
      return {
        family: "rectangular-hollow",
        dimensions: {
          depth: d("h"),
          width: d("b"),
          thickness: d("t"),
          outerRadius: d("ro"),
          innerRadius: d("ri"),
        },
      };
    case "HSS rect":
      return {
        family: "rectangular-hollow",
        dimensions: {
          depth: d("H"),
          width: d("B"),
          thickness: d("tdes"),
          outerRadius: d("ro"),
          innerRadius: d("ri"),
        },
      };
    case "CHS":
      return { family: "round-hollow", dimensions: { diameter: d("D"), thickness: d("t") } };
    case "HSS round/pipe":
      return { family: "round-hollow", dimensions: { diameter: d("OD"), thickness: d("tdes") } };
    case "hollow circle":
      return { family: "round-hollow", dimensions: { diameter: d("D"), thickness: (d("D") - d("d")) / 2 } };
    case "dressed lumber (S4S)":
      return { family: "timber", dimensions: { width: d("b"), depth: d("h") } };
    case "solid circle":
      return { family: "round", dimensions: { diameter: d("d") } };
    default:
      return null;
  }
};

const drawn = (row: CheckRow, d: Dim): Drawing | null => {
  switch (row.shape) {
    case "rectangle":
      return steelDrawing({ shape: plate(d("b"), d("h")) });
    case "square on its diagonal":
      return steelDrawing({ shape: plate(d("a"), d("a")), angle: 45 });
    case "ellipse":
      return ellipse(d("a"), d("b"));
    case "solid semicircle":
      return outline([
        { x: d("r"), y: 0, bulge: 1 },
        { x: -d("r"), y: 0 },
      ]);
    case "fillet spandrel r=50 (square minus quarter circle)":
      return outline([
        { x: 0, y: 0 },
        { x: d("r"), y: 0, bulge: 1 - Math.SQRT2 },
        { x: 0, y: d("r") },
      ]);
    case "regular hexagon":
      return outline(
        Array.from({ length: 6 }, (_, i) => ({
          x: d("a") * Math.cos((Math.PI * i) / 3),
          y: d("a") * Math.sin((Math.PI * i) / 3),
        })),
      );
    case "thin circular tube":
      return steelDrawing({ shape: { kind: "round", diameter: 2 * d("r") + d("t"), wall: d("t") } });
    case "Z of three rectangles": {
      const [h, b, t] = [d("h"), d("b"), d("t")];
      return steelDrawing(
        { shape: plate(t, h) },
        { shape: plate(b - t, t), at: { x: b / 2, y: (h - t) / 2 } },
        { shape: plate(b - t, t), at: { x: -b / 2, y: (t - h) / 2 } },
      );
    }
    case "T: flange 180x20, stem 20x160": {
      const [bf, tf, tw, h] = [d("bf"), d("tf"), d("tw"), d("h")];
      return steelDrawing(
        { shape: plate(bf, tf), at: { x: 0, y: h - tf / 2 } },
        { shape: plate(tw, h - tf), at: { x: 0, y: (h - tf) / 2 } },
      );
    }
    default:
      return null;
  }
};

/** The drawing whose properties a row tells, or null for a row that is not about the area of a section. */
export const drawingOfRow = (row: CheckRow): Drawing | null => {
  const d: Dim = (key) => dimension(row, key);
  const profile = profileOf(row, d);
  return profile === null ? drawn(row, d) : profileDrawing(profile);
};
