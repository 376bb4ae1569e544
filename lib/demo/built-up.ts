import { drawingOf, plate, profilePart, SOFTWOOD, STEEL } from "./drawings";
import type { DemoShape, DemoState } from "./shape";

type Girder = readonly [
  name: string,
  depth: number,
  top: readonly [number, number],
  web: number,
  bottom: readonly [number, number],
  state?: DemoState,
];

const GIRDERS: readonly Girder[] = [
  ["PG 0530-2", 530, [220, 15], 9, [220, 15]],
  ["PG 0580-2", 580, [220, 15], 10, [280, 20]],
  ["PG 0600-1", 600, [250, 15], 8, [250, 15]],
  ["PG 0600-4", 600, [250, 20], 10, [250, 20]],
  ["PG 0620-3", 620, [300, 25], 14, [380, 25]],
  ["PG 0710-1", 710, [260, 20], 10, [300, 25], "submitted"],
  ["PG 0800-1", 800, [300, 20], 10, [300, 20]],
  ["PG 0800-2", 800, [300, 30], 12, [300, 30]],
  ["PG 0900-1", 900, [320, 25], 12, [320, 25]],
  ["PG 1000-1", 1000, [350, 25], 12, [350, 25]],
  ["PG 1000-3", 1000, [350, 35], 14, [350, 35]],
  ["PG 1200-1", 1200, [400, 30], 14, [400, 30]],
  ["PG 1200-2", 1200, [400, 40], 16, [450, 45], "draft"],
];

/** Three plates standing on y = 0, web between the flanges. */
const girderParts = ([, depth, top, web, bottom]: Girder) => {
  const height = depth - top[1] - bottom[1];
  return [
    plate("top", { name: "Top flange", x: 0, y: depth - top[1] / 2 }, top[0], top[1]),
    plate("web", { name: "Web", x: 0, y: bottom[1] + height / 2 }, web, height),
    plate("bottom", { name: "Bottom flange", x: 0, y: bottom[1] / 2 }, bottom[0], bottom[1]),
  ];
};

const FLANGE_WELDS = {
  leg: 6,
  between: [
    ["top", "web"],
    ["web", "bottom"],
  ] as const,
};

const plateGirders = (): DemoShape[] =>
  GIRDERS.map((girder) => {
    const [designation, , top, , bottom, state] = girder;
    const equal = top[0] === bottom[0] && top[1] === bottom[1];
    return {
      designation,
      title: equal ? "Plate girder" : "Plate girder, unequal flanges",
      bay: "Plate girders",
      family: equal ? "plate-girder" : "plate-girder-unequal",
      drawing: drawingOf(girderParts(girder), { fillets: FLANGE_WELDS }),
      ...(state && { state }),
    };
  });

/** A plate girder whose top flange carries a channel, web down, for the horizontal wheel loads. */
const CRANE: readonly (readonly [girder: Girder, channelDepth: number, channelFlange: number])[] = [
  [["CG 0540-2", 540, [200, 16], 10, [220, 20]], 260, 90],
  [["CG 0584-1", 560, [240, 20], 12, [260, 25]], 300, 100],
  [["CG 0632-1", 632, [260, 20], 12, [280, 25], "submitted"], 300, 100],
  [["CG 0740-1", 740, [260, 25], 12, [300, 30]], 300, 100],
];
const CAP_WEB = 9;

const craneGirders = (): DemoShape[] =>
  CRANE.map(([girder, depth, flange]) => {
    const [designation, top, , , , state] = girder;
    const cap = profilePart(
      "cap",
      // A channel has its web at −x: turned by −90° the web lies on top and the flanges point down.
      { name: "Channel on the top flange", x: 0, y: top + CAP_WEB - flange / 2, angle: -90 },
      {
        family: "channel",
        dimensions: {
          depth,
          flangeWidth: flange,
          webThickness: CAP_WEB,
          flangeThickness: 15.5,
          rootRadius: 14,
        },
      },
    );
    return {
      designation,
      title: "Crane girder with channel",
      bay: "Crane girders",
      family: "crane-girder",
      drawing: drawingOf([...girderParts(girder), cap], {
        fillets: { leg: 8, between: [...FLANGE_WELDS.between, ["cap", "top"]] },
      }),
      ...(state && { state }),
    };
  });

const BOXES: readonly (readonly [
  string,
  depth: number,
  width: number,
  flange: number,
  web: number,
  state?: DemoState,
])[] = [
  ["BX 0300-1", 300, 220, 16, 10],
  ["BX 0400-1", 400, 300, 20, 12],
  ["BX 0450-2", 450, 320, 20, 14, "draft"],
  ["BX 0600-1", 600, 400, 25, 14],
  ["BX 0800-1", 800, 500, 25, 16],
];
/** How far the flanges of a box stand out beyond its webs, mm: room for the fillet weld. */
const OUTSTAND = 20;

const boxes = (): DemoShape[] =>
  BOXES.map(([designation, depth, width, flange, web, state]) => {
    const height = depth - 2 * flange;
    const webX = width / 2 - OUTSTAND - web / 2;
    const parts = [
      plate("top", { name: "Top flange", x: 0, y: depth - flange / 2 }, width, flange),
      plate("left", { name: "Left web", x: -webX, y: depth / 2 }, web, height),
      plate("right", { name: "Right web", x: webX, y: depth / 2 }, web, height),
      plate("bottom", { name: "Bottom flange", x: 0, y: flange / 2 }, width, flange),
    ];
    const between = [
      ["top", "left"],
      ["top", "right"],
      ["bottom", "left"],
      ["bottom", "right"],
    ] as const;
    return {
      designation,
      title: "Box of four plates",
      bay: "Boxes",
      family: "box-girder",
      drawing: drawingOf(parts, { fillets: { leg: 8, between } }),
      ...(state && { state }),
    };
  });

const FLITCHES: readonly (readonly [depth: number, timber: number, flitch: number])[] = [
  [195, 45, 8],
  [220, 47, 10],
  [245, 60, 10],
  [300, 75, 12],
];

/** Two timbers with a steel plate between them; the plate is 10 mm short of the edges at top and bottom. */
const flitchBeams = (): DemoShape[] =>
  FLITCHES.map(([depth, timber, flitch]) => {
    const x = (timber + flitch) / 2;
    const parts = [
      plate("left", { name: "Left timber", x: -x, y: depth / 2, material: SOFTWOOD }, timber, depth),
      plate("flitch", { name: "Flitch plate", x: 0, y: depth / 2 }, flitch, depth - 20),
      plate("right", { name: "Right timber", x, y: depth / 2, material: SOFTWOOD }, timber, depth),
    ];
    return {
      designation: `FB ${depth}-${2 * timber + flitch}`,
      title: `Two timbers ${timber} x ${depth}, plate ${flitch} x ${depth - 20}`,
      bay: "Flitch beams",
      family: "flitch-beam",
      drawing: drawingOf(parts, { materials: [SOFTWOOD, STEEL] }),
    };
  });

const angle = (legLong: number, thickness: number) =>
  ({
    family: "angle",
    dimensions: { legLong, legShort: legLong, thickness, rootRadius: thickness, toeRadius: thickness / 2 },
  }) as const;

const jobSpecials = (): DemoShape[] => [
  {
    designation: "JS 2231-A",
    title: "Edge angle of the footbridge deck",
    bay: "Job specials",
    family: "built-up",
    drawing: drawingOf([
      profilePart("angle", { name: "Angle", x: 0, y: 0 }, angle(150, 12)),
      plate("kerb", { name: "Kerb plate", x: 25, y: -81 }, 100, 12),
    ]),
  },
  {
    designation: "JS 2260-C",
    title: "Transfer beam with bottom plate, Loom Street",
    bay: "Job specials",
    family: "cover-plated-beam",
    drawing: drawingOf(
      [
        profilePart(
          "beam",
          { name: "Beam", x: 0, y: 185 },
          {
            family: "i-section",
            dimensions: {
              depth: 370,
              flangeWidth: 165,
              webThickness: 7.8,
              flangeThickness: 12.2,
              rootRadius: 14,
            },
          },
        ),
        plate("cover", { name: "Bottom plate", x: 0, y: -10 }, 280, 20),
      ],
      { fillets: { leg: 8, between: [["beam", "cover"]] } },
    ),
  },
];

export const builtUpShapes = (): DemoShape[] => [
  ...plateGirders(),
  ...craneGirders(),
  ...boxes(),
  ...flitchBeams(),
  ...jobSpecials(),
];
