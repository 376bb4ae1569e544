import { fillet, plate, sizeIn, type Starter, type StarterValues } from "@/lib/drawing/starters/starter";
import { err, ok, type Fault, type Result } from "@/lib/result";

const tooShallow = (what: string): Result<never, Fault> =>
  err({ code: "starter.noRoom", detail: `${what} leave no room for the web. Make the section deeper.` });

const girderParts = (v: StarterValues, top: readonly [number, number], bottom: readonly [number, number]) => {
  const [depth, web] = [sizeIn(v, "depth"), sizeIn(v, "webThickness")];
  const clear = depth - top[1] - bottom[1];
  if (clear <= 0) return tooShallow("The flanges");
  return ok([
    plate("top", "Top flange", top[0], top[1], 0, depth - top[1] / 2),
    plate("web", "Web", web, clear, 0, bottom[1] + clear / 2),
    plate("bottom", "Bottom flange", bottom[0], bottom[1], 0, bottom[1] / 2),
  ]);
};

export const plateGirder: Starter = {
  id: "plate-girder",
  name: "Plate girder",
  note: "Equal flanges and a web",
  fields: [
    { key: "depth", label: "Depth", first: 600 },
    { key: "flangeWidth", label: "Flange width", first: 300 },
    { key: "flangeThickness", label: "Flange thickness", first: 20 },
    { key: "webThickness", label: "Web thickness", first: 10 },
  ],
  parts: (v) => {
    const flange = [sizeIn(v, "flangeWidth"), sizeIn(v, "flangeThickness")] as const;
    return girderParts(v, flange, flange);
  },
  joints: [fillet("top", "web"), fillet("web", "bottom")],
};

export const plateGirderUnequal: Starter = {
  id: "plate-girder-unequal",
  name: "Plate girder, unequal flanges",
  note: "Two flanges of their own sizes and a web",
  fields: [
    { key: "depth", label: "Depth", first: 632 },
    { key: "topWidth", label: "Top width", first: 420 },
    { key: "topThickness", label: "Top thickness", first: 36 },
    { key: "bottomWidth", label: "Bottom width", first: 280 },
    { key: "bottomThickness", label: "Bottom thickness", first: 32 },
    { key: "webThickness", label: "Web thickness", first: 18 },
  ],
  parts: (v) =>
    girderParts(
      v,
      [sizeIn(v, "topWidth"), sizeIn(v, "topThickness")],
      [sizeIn(v, "bottomWidth"), sizeIn(v, "bottomThickness")],
    ),
  joints: [fillet("top", "web"), fillet("web", "bottom")],
};

export const boxGirder: Starter = {
  id: "box-girder",
  name: "Box girder",
  note: "Two flanges and two webs",
  fields: [
    { key: "depth", label: "Depth", first: 800 },
    { key: "width", label: "Flange width", first: 500 },
    { key: "flangeThickness", label: "Flange thickness", first: 25 },
    { key: "webThickness", label: "Web thickness", first: 12 },
    { key: "clear", label: "Between webs", first: 420 },
  ],
  parts: (v) => {
    const [depth, width, flange] = [sizeIn(v, "depth"), sizeIn(v, "width"), sizeIn(v, "flangeThickness")];
    const [web, clear] = [sizeIn(v, "webThickness"), sizeIn(v, "clear")];
    const height = depth - 2 * flange;
    if (height <= 0) return tooShallow("The flanges");
    if (clear + 2 * web > width)
      return err({
        code: "starter.websOutside",
        detail: "The webs stand outside the flanges. Bring them closer.",
      });
    const x = (clear + web) / 2;
    return ok([
      plate("top", "Top flange", width, flange, 0, depth - flange / 2),
      plate("left", "Left web", web, height, -x, depth / 2),
      plate("right", "Right web", web, height, x, depth / 2),
      plate("bottom", "Bottom flange", width, flange, 0, flange / 2),
    ]);
  },
  joints: [
    fillet("top", "left"),
    fillet("top", "right"),
    fillet("left", "bottom"),
    fillet("right", "bottom"),
  ],
};

export const tee: Starter = {
  id: "tee",
  name: "Tee",
  note: "A flange on a stem",
  fields: [
    { key: "depth", label: "Depth", first: 250 },
    { key: "flangeWidth", label: "Flange width", first: 200 },
    { key: "flangeThickness", label: "Flange thickness", first: 16 },
    { key: "webThickness", label: "Stem thickness", first: 10 },
  ],
  parts: (v) => {
    const [depth, flange] = [sizeIn(v, "depth"), sizeIn(v, "flangeThickness")];
    const stem = depth - flange;
    if (stem <= 0) return tooShallow("The flange does");
    return ok([
      plate("flange", "Flange", sizeIn(v, "flangeWidth"), flange, 0, depth - flange / 2),
      plate("stem", "Stem", sizeIn(v, "webThickness"), stem, 0, stem / 2),
    ]);
  },
  joints: [fillet("flange", "stem")],
};

export const cruciform: Starter = {
  id: "cruciform",
  name: "Cruciform",
  note: "One plate through, two against it",
  fields: [
    { key: "depth", label: "Depth", first: 300 },
    { key: "width", label: "Width", first: 300 },
    { key: "thickness", label: "Thickness", first: 20 },
  ],
  parts: (v) => {
    const [depth, width, t] = [sizeIn(v, "depth"), sizeIn(v, "width"), sizeIn(v, "thickness")];
    const arm = (width - t) / 2;
    if (arm <= 0 || depth <= t)
      return err({
        code: "starter.noArms",
        detail: "The arms vanish in the thickness. Make the cross larger.",
      });
    const x = t / 2 + arm / 2;
    return ok([
      plate("upright", "Upright plate", t, depth, 0, depth / 2),
      plate("left", "Left arm", arm, t, -x, depth / 2),
      plate("right", "Right arm", arm, t, x, depth / 2),
    ]);
  },
  joints: [fillet("upright", "left"), fillet("upright", "right")],
};

export const plateChannel: Starter = {
  id: "plate-channel",
  name: "Channel from plates",
  note: "A web with two flanges to the right",
  fields: [
    { key: "depth", label: "Depth", first: 400 },
    { key: "width", label: "Overall width", first: 120 },
    { key: "flangeThickness", label: "Flange thickness", first: 16 },
    { key: "webThickness", label: "Web thickness", first: 10 },
  ],
  parts: (v) => {
    const [depth, width] = [sizeIn(v, "depth"), sizeIn(v, "width")];
    const [flange, web] = [sizeIn(v, "flangeThickness"), sizeIn(v, "webThickness")];
    const arm = width - web;
    if (2 * flange >= depth) return tooShallow("The flanges");
    if (arm <= 0)
      return err({
        code: "starter.noFlange",
        detail: "The web takes the whole width. Make the channel wider.",
      });
    const x = web / 2;
    return ok([
      plate("top", "Top flange", arm, flange, x, depth - flange / 2),
      plate("web", "Web", web, depth, (web - width) / 2, depth / 2),
      plate("bottom", "Bottom flange", arm, flange, x, flange / 2),
    ]);
  },
  joints: [fillet("top", "web"), fillet("web", "bottom")],
};

export const tube: Starter = {
  id: "tube",
  name: "Tube",
  note: "A round with a wall",
  fields: [
    { key: "diameter", label: "Diameter", first: 219.1 },
    { key: "wall", label: "Wall", first: 8 },
  ],
  parts: (v) => {
    const [diameter, wall] = [sizeIn(v, "diameter"), sizeIn(v, "wall")];
    if (2 * wall >= diameter)
      return err({ code: "starter.noBore", detail: "The wall leaves no bore. Make it thinner." });
    return ok([
      {
        role: "tube",
        name: "Tube",
        shape: { kind: "round", diameter, wall },
        at: { x: 0, y: diameter / 2 },
      },
    ]);
  },
  joints: [],
};
