import type { Ring } from "@/lib/geometry/region";
import type { Box } from "@/lib/figure/display-list";

/** A part as a figure sees it. `rings` in drawing axes (even-odd), `box` around them, mm. */
export type FigurePart = Readonly<{
  id: string;
  /** The number in its balloon, the same in parts table and tabulation. */
  item: string;
  rings: readonly Ring[];
  box: Box;
  cutout: boolean;
  /** A plate or flat standing square to the axes: its thickness is dimensioned across it. */
  plain: boolean;
  /** Inner levels of a profile that belong into the chain (flange edges), drawing y in mm. */
  levels: readonly number[];
  timber: boolean;
  inHand: boolean;
}>;
