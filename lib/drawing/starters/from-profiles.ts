import {
  fillet,
  plate,
  sizeIn,
  type Starter,
  type StarterField,
  type StarterPart,
  type StarterValues,
} from "@/lib/drawing/starters/starter";
import { err, ok } from "@/lib/result";

const BEAM_FIELDS: readonly StarterField[] = [
  { key: "depth", label: "Beam depth", first: 400 },
  { key: "flangeWidth", label: "Flange width", first: 180 },
  { key: "webThickness", label: "Web thickness", first: 8.6 },
  { key: "flangeThickness", label: "Flange thickness", first: 13.5 },
  { key: "rootRadius", label: "Root radius", first: 21, mayBeZero: true },
];

const beam = (v: StarterValues, underside: number): StarterPart => ({
  role: "beam",
  name: "Beam",
  shape: {
    kind: "profile",
    family: "i-section",
    dimensions: {
      depth: sizeIn(v, "depth"),
      flangeWidth: sizeIn(v, "flangeWidth"),
      webThickness: sizeIn(v, "webThickness"),
      flangeThickness: sizeIn(v, "flangeThickness"),
      rootRadius: sizeIn(v, "rootRadius"),
    },
  },
  at: { x: 0, y: underside + sizeIn(v, "depth") / 2 },
});

export const coverPlatedBeam: Starter = {
  id: "cover-plated-beam",
  name: "Cover-plated beam",
  note: "A rolled beam with plates on both flanges",
  fields: [
    ...BEAM_FIELDS,
    { key: "coverWidth", label: "Cover width", first: 150 },
    { key: "coverThickness", label: "Cover thickness", first: 12 },
  ],
  parts: (v) => {
    const [width, t, depth] = [sizeIn(v, "coverWidth"), sizeIn(v, "coverThickness"), sizeIn(v, "depth")];
    return ok([
      plate("top", "Top cover", width, t, 0, depth + 1.5 * t),
      beam(v, t),
      plate("bottom", "Bottom cover", width, t, 0, t / 2),
    ]);
  },
  joints: [fillet("top", "beam"), fillet("beam", "bottom")],
};

export const craneGirder: Starter = {
  id: "crane-girder",
  name: "Crane runway girder",
  note: "A rolled beam with a channel cap",
  fields: [
    ...BEAM_FIELDS,
    { key: "capDepth", label: "Cap depth", first: 260 },
    { key: "capFlangeWidth", label: "Cap flange width", first: 90 },
    { key: "capWebThickness", label: "Cap web thickness", first: 10 },
    { key: "capFlangeThickness", label: "Cap flange thickness", first: 14 },
    { key: "capRootRadius", label: "Cap root radius", first: 14, mayBeZero: true },
  ],
  parts: (v) => {
    const [depth, capDepth] = [sizeIn(v, "depth"), sizeIn(v, "capDepth")];
    const [flange, web, radius] = [
      sizeIn(v, "capFlangeThickness"),
      sizeIn(v, "capWebThickness"),
      sizeIn(v, "capRootRadius"),
    ];
    const clear = capDepth - 2 * flange - 2 * radius;
    if (clear < sizeIn(v, "flangeWidth"))
      return err({
        code: "starter.capNarrow",
        detail: `The cap is clear for ${Math.max(clear, 0)} mm between its fillets: the beam's flange does not go in.`,
      });
    const reach = sizeIn(v, "capFlangeWidth");
    return ok([
      {
        role: "cap",
        name: "Channel cap",
        shape: {
          kind: "profile",
          family: "channel",
          dimensions: {
            depth: capDepth,
            flangeWidth: reach,
            webThickness: web,
            flangeThickness: flange,
            rootRadius: radius,
          },
        },
        at: { x: 0, y: depth + web - reach / 2 },
        angle: -90,
      },
      beam(v, 0),
    ]);
  },
  joints: [fillet("cap", "beam")],
};

export const doubleAngle: Starter = {
  id: "double-angle",
  name: "Double angle",
  note: "Two angles back to back",
  fields: [
    { key: "legLong", label: "Upright leg", first: 120 },
    { key: "legShort", label: "Level leg", first: 80 },
    { key: "thickness", label: "Thickness", first: 10 },
    { key: "rootRadius", label: "Root radius", first: 11, mayBeZero: true },
    { key: "toeRadius", label: "Toe radius", first: 5.5, mayBeZero: true },
    { key: "gap", label: "Gap", first: 0, mayBeZero: true },
  ],
  parts: (v) => {
    const [legLong, legShort, gap] = [sizeIn(v, "legLong"), sizeIn(v, "legShort"), sizeIn(v, "gap")];
    const shape = {
      kind: "profile",
      family: "angle",
      dimensions: {
        legLong,
        legShort,
        thickness: sizeIn(v, "thickness"),
        rootRadius: sizeIn(v, "rootRadius"),
        toeRadius: sizeIn(v, "toeRadius"),
      },
    } as const;
    const x = (gap + legShort) / 2;
    return ok([
      { role: "left", name: "Left angle", shape, at: { x: -x, y: legLong / 2 }, mirror: true },
      { role: "right", name: "Right angle", shape, at: { x, y: legLong / 2 } },
    ]);
  },
  joints: [{ between: ["left", "right"], kind: "bolts" }],
};

export const flitchBeam: Starter = {
  id: "flitch-beam",
  name: "Flitch beam",
  note: "A steel plate bolted between two timbers",
  fields: [
    { key: "timberWidth", label: "Timber width, each", first: 60 },
    { key: "timberDepth", label: "Timber depth", first: 240 },
    { key: "plateThickness", label: "Plate thickness", first: 12 },
    { key: "plateDepth", label: "Plate depth", first: 220 },
  ],
  parts: (v) => {
    const [width, depth] = [sizeIn(v, "timberWidth"), sizeIn(v, "timberDepth")];
    const [t, plateDepth] = [sizeIn(v, "plateThickness"), sizeIn(v, "plateDepth")];
    const timber = (role: string, name: string, x: number): StarterPart => ({
      role,
      name,
      shape: { kind: "profile", family: "timber", dimensions: { width, depth } },
      at: { x, y: depth / 2 },
      timber: true,
    });
    const x = (t + width) / 2;
    return ok([
      timber("left", "Left timber", -x),
      plate("plate", "Flitch plate", t, plateDepth, 0, depth / 2),
      timber("right", "Right timber", x),
    ]);
  },
  joints: [
    { between: ["left", "plate"], kind: "bolts" },
    { between: ["plate", "right"], kind: "bolts" },
  ],
};
