import type { FamilyDimensions } from "@/lib/profiles/families";
import { profileDrawing } from "./drawings";
import type { DemoShape } from "./shape";

/** An invented serial size: nominal depth and width, the widths' step and the flanges' range, mm. */
type Serial = readonly [depth: number, width: number, web: number, flange: number, root: number];

const BEAMS: readonly Serial[] = [
  [120, 65, 4.4, 6.2, 7],
  [150, 80, 4.8, 7.0, 8],
  [180, 95, 5.2, 7.8, 9],
  [210, 105, 5.6, 8.6, 10],
  [240, 120, 6.0, 9.4, 11],
  [280, 135, 6.6, 10.2, 12],
  [320, 150, 7.1, 11.0, 13],
  [370, 165, 7.8, 12.2, 14],
  [420, 180, 8.5, 13.4, 16],
  [470, 195, 9.3, 14.6, 17],
  [540, 210, 10.0, 15.6, 18],
  [600, 230, 10.8, 17.2, 20],
  [690, 250, 12.2, 19.2, 22],
];

const COLUMNS: readonly Serial[] = [
  [150, 150, 6.4, 9.4, 10],
  [200, 205, 7.4, 11.2, 12],
  [250, 255, 8.8, 14.0, 14],
  [300, 305, 10.2, 16.0, 16],
  [340, 315, 12.0, 20.0, 18],
  [360, 370, 12.4, 20.6, 18],
];

const CHANNELS: readonly Serial[] = [
  [100, 50, 5.0, 8.4, 9],
  [150, 70, 6.0, 10.0, 10],
  [200, 75, 6.8, 11.8, 12],
  [260, 90, 8.0, 13.6, 13],
  [300, 100, 9.0, 15.5, 14],
];

const TEES: readonly Serial[] = [
  [105, 105, 5.6, 8.6, 10],
  [160, 150, 7.1, 11.0, 13],
  [210, 180, 8.5, 13.4, 16],
  [270, 210, 10.0, 15.6, 18],
];

/** The rolls open: each heavier weight has thicker flanges outside and a thicker web. */
const WEIGHTS = [0, 1, 2, 3] as const;
const DENSITY_KG_PER_M3 = 7850;
const round = (value: number, step: number) => Math.round(value / step) * step;
const tenth = (value: number) => Number(round(value, 0.1).toFixed(1));

type ISection = FamilyDimensions["i-section"];

const heavier = ([depth, width, web, flange, root]: Serial, weight: number): ISection => {
  const extra = tenth(flange * 0.22 * weight);
  return {
    depth: tenth(depth + 2 * extra),
    flangeWidth: tenth(width + web * 0.2 * weight),
    webThickness: tenth(web * (1 + 0.2 * weight)),
    flangeThickness: tenth(flange + extra),
    rootRadius: root,
  };
};

const PIECES = {
  "i-section": { flanges: 2, fillets: 4 },
  channel: { flanges: 2, fillets: 2 },
  tee: { flanges: 1, fillets: 2 },
} as const;
type RolledFamily = keyof typeof PIECES;

/** Mass for the designation only: flanges, web and fillets. The figures of the shape are the engine's. */
const nominalMass = (d: ISection, family: RolledFamily): number => {
  const { flanges, fillets } = PIECES[family];
  const web = (d.depth - flanges * d.flangeThickness) * d.webThickness;
  const corners = fillets * (1 - Math.PI / 4) * d.rootRadius ** 2;
  return ((flanges * d.flangeWidth * d.flangeThickness + web + corners) * DENSITY_KG_PER_M3) / 1e6;
};

const rolled = (
  prefix: string,
  title: string,
  serials: readonly Serial[],
  family: RolledFamily,
  bay: DemoShape["bay"],
): DemoShape[] =>
  serials.flatMap((serial) =>
    (family === "i-section" ? WEIGHTS : WEIGHTS.slice(0, 2)).map((weight) => {
      const dimensions = heavier(serial, weight);
      const mass = nominalMass(dimensions, family);
      const size = `${prefix} ${serial[0]}x${serial[1]}`;
      const designation = `${size}x${mass < 100 ? tenth(mass) : Math.round(mass)}`;
      return { designation, title, bay, family, drawing: profileDrawing(title, { family, dimensions }) };
    }),
  );

export const rolledShapes = (): DemoShape[] => [
  ...rolled("RB", "Rolled beam", BEAMS, "i-section", "Rolled beams"),
  ...rolled("RC", "Rolled column", COLUMNS, "i-section", "Rolled columns"),
  ...rolled("CH", "Channel", CHANNELS, "channel", "Channels and tees"),
  ...rolled("TE", "Tee", TEES, "tee", "Channels and tees"),
];
