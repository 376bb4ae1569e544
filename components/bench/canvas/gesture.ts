import type { BenchActions, BenchStore } from "@/components/bench/bench-store";
import type { Overlay } from "@/components/bench/canvas/overlay";
import type { SnapOptions } from "@/lib/drawing/snap";
import type { Point } from "@/lib/geometry/region";

export type PointerAt = Readonly<{
  /** Drawing axes, mm. */
  at: Point;
  /** On the canvas, px. */
  screen: Point;
  shift: boolean;
}>;

export type GestureTools = Readonly<{
  store: BenchStore;
  act: BenchActions;
  show: (overlay: Partial<Overlay>) => void;
  /** How near counts now: none while Q is held or snapping is off. */
  snap: () => SnapOptions;
  /** A length typed while the hand drags, in the person's units, to mm. */
  readLength: (text: string) => number | null;
  formatLength: (mm: number) => string;
}>;

/** One pull of the hand, or a run of clicks: told of every move and of its end. */
export type Gesture = Readonly<{
  move: (p: PointerAt) => void;
  /** The button came up: true when the gesture is over. */
  up: (p: PointerAt) => boolean;
  /** Pressed again within a gesture of several clicks. */
  press?: (p: PointerAt) => boolean;
  /** A key while it goes on: true when it was used; "done" when that ended it. */
  key?: (event: KeyboardEvent) => boolean | "done";
  cancel: () => void;
}>;
