"use client";
import { useBenchActions } from "@/components/bench/bench-store";
import { OutlineEditor } from "@/components/bench/table/outline-editor";
import { QuantityField } from "@/components/display/quantity-field";
import { Popover } from "@/components/ui/popover";
import { ChevronSign } from "@/components/ui/signs";
import { Button } from "@/components/ui/button";
import { typedMm } from "@/lib/drawing/add-row";
import { shapeRegions } from "@/lib/drawing/part-regions";
import { reshapePart } from "@/lib/drawing/edit-parts";
import { PartShape, type DrawingPart } from "@/lib/drawing/schema";
import { DIMENSION_NAME, PROFILE_NAME } from "@/lib/profiles/family-fields";

const nameOf = ({ shape }: DrawingPart): string => {
  switch (shape.kind) {
    case "plate":
      return "Plate";
    case "round":
      return shape.wall === undefined ? "Round" : "Tube";
    case "outline":
      return "Outline";
    case "profile":
      return PROFILE_NAME[shape.family];
  }
};

const Opener = ({ name, item }: { name: string; item: number }) => (
  <button
    type="button"
    aria-label={`${name}, item ${item}: its sizes`}
    className="inline-flex h-6 items-center gap-1.5 hover:text-ink max-md:h-11"
  >
    <span className="max-w-24 truncate">{name}</span>
    <ChevronSign />
  </button>
);

/** What a part is made from; profiles, rounds and outlines open their own sizes. */
export const ShapeSizes = ({ part, item }: { part: DrawingPart; item: number }) => {
  const name = nameOf(part);
  const { shape } = part;
  if (shape.kind === "plate") return <>{name}</>;
  return (
    <Popover label={`Sizes of item ${item}`} trigger={Opener({ name, item })}>
      {shape.kind === "outline" && <OutlineEditor part={part} item={item} />}
      {shape.kind === "profile" && <ProfileSizes part={part} />}
      {shape.kind === "round" && <RoundSizes part={part} />}
    </Popover>
  );
};

const RoundSizes = ({ part }: { part: DrawingPart }) => {
  const act = useBenchActions();
  if (part.shape.kind !== "round") return null;
  const { diameter, wall } = part.shape;
  return wall === undefined ? (
    <Button
      onClick={() =>
        act.edit((d) => reshapePart(d, part.id, { kind: "round", diameter, wall: typedMm(diameter / 20) }))
      }
    >
      Make it a tube
    </Button>
  ) : (
    <Button onClick={() => act.edit((d) => reshapePart(d, part.id, { kind: "round", diameter }))}>
      Make it solid
    </Button>
  );
};

const ProfileSizes = ({ part }: { part: DrawingPart }) => {
  const act = useBenchActions();
  const { shape } = part;
  if (shape.kind !== "profile") return null;
  const next = (key: string, value: number) =>
    PartShape.safeParse({ ...shape, dimensions: { ...shape.dimensions, [key]: value } });
  const refuse = (key: string) => (value: number) => {
    const made = next(key, value);
    if (!made.success) return "That size is not possible here.";
    const regions = shapeRegions(made.data);
    return regions.ok ? null : (regions.error[0]?.detail ?? "These sizes do not fit together.");
  };
  return (
    <div className="grid w-64 grid-cols-[1fr_auto] items-center gap-x-3 gap-y-1">
      {Object.entries(shape.dimensions).map(([key, value]) => (
        <div key={key} className="contents">
          <span className="text-table text-ink-2">{DIMENSION_NAME[key] ?? key}</span>
          <QuantityField
            aria-label={DIMENSION_NAME[key] ?? key}
            dimension={key === "flangeSlope" ? "ratio" : "length"}
            value={Number(value)}
            refuse={refuse(key)}
            onCommit={(mm) => {
              const made = mm === null ? null : next(key, key === "flangeSlope" ? mm : typedMm(mm));
              if (made?.success) act.edit((d) => reshapePart(d, part.id, made.data));
            }}
          />
        </div>
      ))}
    </div>
  );
};
