import type { DrawingPart, PartShape } from "@/lib/drawing/schema";

/** The two sizes of a part that stand in the parts table; other shapes show the box and open their own sizes. */
export type SizeField = Readonly<{ label: string; value: number; set: (mm: number) => PartShape }>;

export const sizeFields = (part: DrawingPart): readonly [SizeField | null, SizeField | null] => {
  const { shape } = part;
  switch (shape.kind) {
    case "plate":
      return [
        { label: "Width", value: shape.width, set: (width) => ({ ...shape, width }) },
        { label: "Height", value: shape.height, set: (height) => ({ ...shape, height }) },
      ];
    case "round": {
      const wall: SizeField | null =
        shape.wall === undefined
          ? null
          : { label: "Wall", value: shape.wall, set: (mm) => ({ ...shape, wall: mm }) };
      return [
        { label: "Diameter", value: shape.diameter, set: (diameter) => ({ ...shape, diameter }) },
        part.cutout === true ? null : wall,
      ];
    }
    case "outline":
    case "profile":
      return [null, null];
  }
};
