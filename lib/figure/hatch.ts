import type { Point, Ring } from "@/lib/geometry/region";
import type { Hatch } from "@/lib/figure/display-list";
import { chordsOf, crossings } from "@/lib/figure/outline";
import { toScreen, type View } from "@/lib/figure/view";

type Pattern = Readonly<{ deg: number; pitchPx: number }>;

/** Angle on screen (y down: −45 rises to the right) and pitch of each hatch. */
const PATTERNS: Partial<Record<Hatch, Pattern>> = {
  rising: { deg: -45, pitchPx: 6 },
  falling: { deg: 45, pitchPx: 6 },
  "rising-wide": { deg: -45, pitchPx: 9 },
  "falling-wide": { deg: 45, pitchPx: 9 },
  grain: { deg: 90, pitchPx: 5 },
};
const MAX_LINES = 4_000;
const round = (v: number) => Math.round(v * 10) / 10;

/**
 * Hatch lines as path data on screen, clipped to the rings (even-odd). Lines are anchored to the drawing's origin, so they
 * do not swim when the view is panned. Empty for solid, void and none.
 */
export const hatchData = (rings: readonly Ring[], hatch: Hatch, view: View): string => {
  const pattern = PATTERNS[hatch];
  if (!pattern) return "";
  const turn = (-pattern.deg * Math.PI) / 180;
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  const forth = (p: Point): Point => ({ x: p.x * c - p.y * s, y: p.x * s + p.y * c });
  const back = (x: number, y: number): Point => ({ x: x * c + y * s, y: -x * s + y * c });
  const loops = rings.map((ring) => chordsOf(ring).map((p) => forth(toScreen(view, p))));
  let [low, high] = [Infinity, -Infinity];
  for (const loop of loops)
    for (const p of loop) {
      low = Math.min(low, p.y);
      high = Math.max(high, p.y);
    }
  if (!(high > low)) return "";
  const anchor = forth({ x: view.xPx, y: view.yPx }).y;
  const first = Math.ceil((low - anchor) / pattern.pitchPx);
  const last = Math.min(Math.floor((high - anchor) / pattern.pitchPx), first + MAX_LINES);
  let data = "";
  for (let k = first; k <= last; k++) {
    const y = anchor + k * pattern.pitchPx;
    const xs = crossings(loops, y);
    for (let i = 0; i + 1 < xs.length; i += 2) {
      const a = back(xs[i] ?? 0, y);
      const b = back(xs[i + 1] ?? 0, y);
      data += `M${round(a.x)} ${round(a.y)}L${round(b.x)} ${round(b.y)}`;
    }
  }
  return data;
};

const TURNS = ["rising", "falling", "rising-wide", "falling-wide"] as const;

/**
 * A hatch for each part so that touching parts differ: opposite directions first, then the wide pitch.
 * @param touching pairs of part ids that share an edge.
 */
export const hatchByPart = (
  ids: readonly string[],
  touching: readonly (readonly [string, string])[],
): ReadonlyMap<string, Hatch> => {
  const near = new Map<string, string[]>();
  for (const [a, b] of touching) {
    near.set(a, [...(near.get(a) ?? []), b]);
    near.set(b, [...(near.get(b) ?? []), a]);
  }
  const chosen = new Map<string, Hatch>();
  for (const id of ids) {
    const taken = new Set((near.get(id) ?? []).map((other) => chosen.get(other)));
    chosen.set(id, TURNS.find((h) => !taken.has(h)) ?? "rising");
  }
  return chosen;
};
