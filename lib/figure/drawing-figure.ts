import { placedRegions } from "@/lib/drawing/placed-part";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import type { Ring } from "@/lib/geometry/region";
import type { Contact } from "@/lib/section/section";
import type { AxisProperties } from "@/lib/figure/axis-items";
import { composeFigure, ringsOf, type FigureShow } from "@/lib/figure/compose-figure";
import type { DisplayList } from "@/lib/figure/display-list";
import type { FigurePart } from "@/lib/figure/figure-part";
import { boxOfRings } from "@/lib/figure/outline";
import { isTimber, levelsOf, standsSquare } from "@/lib/figure/part-facts";
import { weldMarks } from "@/lib/figure/welds";

export type DrawingFigureInput = Readonly<{
  drawing: Drawing;
  picked: ReadonlySet<string>;
  /** Lines along which parts touch, as last computed; marks of parts that moved since are left out. */
  contacts: readonly Contact[];
  moving: ReadonlySet<string>;
  properties: AxisProperties | null;
  pxPerMm: number;
  formatLength: (mm: number) => string;
  show: FigureShow;
}>;

type Drawn = Readonly<{ rings: readonly Ring[]; box: FigurePart["box"] }>;
const drawn = new WeakMap<DrawingPart, Drawn | null>();

const drawnPart = (part: DrawingPart): Drawn | null => {
  const known = drawn.get(part);
  if (known !== undefined) return known;
  const rings = ringsOf(placedRegions(part));
  const box = boxOfRings(rings);
  const made = box ? { rings, box } : null;
  drawn.set(part, made);
  return made;
};

/** A drawing as it stands on the Bench: every part whole, cut-outs on top as paper, so that it can be shown at once. */
export const drawingFigure = (input: DrawingFigureInput): DisplayList => {
  const { drawing, picked, moving } = input;
  const materials = new Map(drawing.materials.map((m) => [m.id, m]));
  const parts = drawing.parts.flatMap((part, i): FigurePart[] => {
    const known = drawnPart(part);
    if (!known) return [];
    const material = part.cutout === true ? undefined : materials.get(part.material);
    return [
      {
        id: part.id,
        item: String(i + 1),
        ...known,
        cutout: part.cutout === true,
        plain: standsSquare(part),
        levels: levelsOf(part, known.box),
        timber: material !== undefined && isTimber(material),
        inHand: picked.has(part.id),
      },
    ];
  });
  const rings = new Map(parts.map((p) => [p.id, p.rings]));
  const still = input.contacts.filter((c) => !c.parts.some((id) => moving.has(id)));
  return composeFigure({
    parts,
    touching: input.contacts.map((c) => c.parts),
    properties: input.properties,
    welds: weldMarks(still, drawing.joints, (id) => rings.get(id) ?? []),
    pxPerMm: input.pxPerMm,
    formatLength: input.formatLength,
    show: input.show,
  });
};
