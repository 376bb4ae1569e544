import {
  boxGirder,
  cruciform,
  plateChannel,
  plateGirder,
  plateGirderUnequal,
  tee,
  tube,
} from "@/lib/drawing/starters/from-plates";
import { coverPlatedBeam, craneGirder, doubleAngle, flitchBeam } from "@/lib/drawing/starters/from-profiles";
import type { Starter } from "@/lib/drawing/starters/starter";

/** Every starter, in the order in which they are offered. */
export const STARTERS: readonly Starter[] = [
  plateGirder,
  plateGirderUnequal,
  boxGirder,
  tee,
  cruciform,
  plateChannel,
  coverPlatedBeam,
  craneGirder,
  doubleAngle,
  flitchBeam,
  tube,
];

export const starterById = (id: string): Starter | undefined => STARTERS.find((s) => s.id === id);

export const firstValues = (starter: Starter): Record<string, number> =>
  Object.fromEntries(starter.fields.map((f) => [f.key, f.first]));
