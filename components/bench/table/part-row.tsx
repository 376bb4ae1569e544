"use client";
import { memo, useState } from "react";
import { useBenchActions } from "@/components/bench/bench-store";
import { CellField } from "@/components/bench/table/cell-field";
import { PartMenu } from "@/components/bench/table/part-menu";
import { ShapeSizes } from "@/components/bench/table/shape-sizes";
import { sizeFields } from "@/components/bench/table/size-fields";
import { Count, Quantity } from "@/components/display/quantity";
import { cx } from "@/components/ui/cx";
import { fieldClass } from "@/components/ui/field";
import { Balloon } from "@/components/ui/marks";
import { Select } from "@/components/ui/select";
import { typedMm } from "@/lib/drawing/add-row";
import { changePart } from "@/lib/drawing/edit-parts";
import type { DrawingMaterial, DrawingPart } from "@/lib/drawing/schema";
import type { Slenderness } from "@/lib/drawing/slenderness";
import { partBox } from "@/lib/drawing/placed-part";
import { MAX_LENGTH_MM, MIN_SIZE_MM } from "@/lib/geometry/limits";

export const refuseSize = (mm: number): string | null =>
  mm < MIN_SIZE_MM ? "A part needs a size above 0." : mm > MAX_LENGTH_MM ? "Sizes go up to 1 km." : null;
const refusePlace = (mm: number) =>
  Math.abs(mm) > MAX_LENGTH_MM ? "Places go up to 1 km from the datum." : null;
const refuseTurn = (deg: number) => (Math.abs(deg) > 360 ? "Rotation goes from −360 to 360 degrees." : null);

type PartRowProps = Readonly<{
  part: DrawingPart;
  item: number;
  inHand: boolean;
  materials: readonly DrawingMaterial[];
  /** Area in mm², mass in kg/m; undefined until they are computed. */
  area: number | undefined;
  mass: number | undefined;
  slendernessRatio: number | undefined;
  slendernessKind: Slenderness["kind"] | undefined;
}>;

const CELL = "h-7 border-b border-rule px-[3px] max-md:h-11";

/** One part, every number of it to be typed. Focus in the row picks the part, as a click on the canvas does. */
export const PartRow = memo(function PartRow(props: PartRowProps) {
  const { part, item, inHand, materials, area, mass, slendernessRatio, slendernessKind } = props;
  const act = useBenchActions();
  const change = (next: (p: DrawingPart) => DrawingPart) => act.edit((d) => changePart(d, part.id, next));
  const [width, height] = sizeFields(part);
  const box = width === null ? partBox(part) : null;
  return (
    <tr
      data-part={part.id}
      aria-selected={inHand}
      className={cx(inHand && "[&>td]:bg-wash [&>td:first-child]:shadow-[inset_3px_0_0_var(--fb-oxide-ink)]")}
      onFocus={(event) => {
        if (event.target instanceof HTMLInputElement && !inHand) act.pick([part.id]);
      }}
      onPointerEnter={() => act.hover(part.id)}
      onPointerLeave={() => act.hover(null)}
    >
      <td className={cx(CELL, "pl-2 text-center")}>
        <button
          type="button"
          aria-label={`Item ${item}, ${part.name || "part"}: pick it`}
          aria-pressed={inHand}
          className="inline-flex size-6 items-center justify-center max-md:size-11"
          onClick={(event) => (event.shiftKey ? act.togglePick(part.id) : act.pick([part.id]))}
        >
          <Balloon inHand={inHand}>{item}</Balloon>
        </button>
      </td>
      <td className={CELL}>
        <NameField
          name={part.name}
          label={`Name of item ${item}`}
          onCommit={(name) => change((p) => ({ ...p, name }))}
        />
      </td>
      <td className={cx(CELL, "px-2 whitespace-nowrap text-ink-2 max-md:hidden")}>
        <ShapeSizes part={part} item={item} />
      </td>
      {[width, height].map((field, i) => (
        <td key={i} className={cx(CELL, "text-right")} data-col={i}>
          {field ? (
            <CellField
              label={`${field.label} of item ${item}`}
              value={field.value}
              refuse={refuseSize}
              onCommit={(mm) => change((p) => ({ ...p, shape: field.set(typedMm(mm)) }))}
            />
          ) : (
            <span className="px-1.5 text-ink-3">
              {box && (
                <Quantity dimension="length" value={i === 0 ? box.xMax - box.xMin : box.yMax - box.yMin} />
              )}
            </span>
          )}
        </td>
      ))}
      <td className={cx(CELL, "text-right")}>
        <CellField
          label={`x of item ${item}`}
          value={part.at.x}
          refuse={refusePlace}
          onCommit={(x) => change((p) => ({ ...p, at: { ...p.at, x: typedMm(x) } }))}
        />
      </td>
      <td className={cx(CELL, "text-right")}>
        <CellField
          label={`y of item ${item}`}
          value={part.at.y}
          refuse={refusePlace}
          onCommit={(y) => change((p) => ({ ...p, at: { ...p.at, y: typedMm(y) } }))}
        />
      </td>
      <td className={cx(CELL, "text-right max-md:hidden")}>
        <CellField
          label={`Rotation of item ${item}`}
          dimension="angle"
          value={part.angle}
          refuse={refuseTurn}
          onCommit={(angle) => change((p) => ({ ...p, angle }))}
        />
      </td>
      <td className={cx(CELL, "max-md:hidden")}>
        {part.cutout === true ? (
          <span className="px-1.5 text-ink-3">hole</span>
        ) : (
          <Select
            aria-label={`Grade of item ${item}`}
            value={part.material}
            choices={materials.map((m) => ({ value: m.id, label: m.name }))}
            onChange={(material) => change((p) => (p.cutout === true ? p : { ...p, material }))}
            className="h-6 w-full text-table"
          />
        )}
      </td>
      <td className={cx(CELL, "computed", "px-2 text-right")}>
        <Quantity dimension="area" value={area} />
      </td>
      <td className={cx(CELL, "computed", "px-2 text-right")}>
        <Quantity dimension="linearMass" value={mass} />
      </td>
      <td
        className={cx(CELL, "computed", "px-2 text-right whitespace-nowrap max-lg:hidden")}
        title={slendernessKind}
      >
        {slendernessRatio !== undefined && (
          <>
            <Count value={slendernessRatio} decimals={1} />
            {slendernessKind === "between faces" && <span className="text-note text-ink-3"> faces</span>}
          </>
        )}
      </td>
      <td className={cx(CELL, "pr-1 text-right")}>
        <PartMenu part={part} item={item} />
      </td>
    </tr>
  );
});

const NameField = ({
  name,
  label,
  onCommit,
}: {
  name: string;
  label: string;
  onCommit: (name: string) => void;
}) => {
  const [typed, setTyped] = useState<string | null>(null);
  const commit = () => {
    if (typed !== null && typed.trim() !== name) onCommit(typed.trim().slice(0, 120));
    setTyped(null);
  };
  return (
    <input
      type="text"
      aria-label={label}
      value={typed ?? name}
      maxLength={120}
      autoComplete="off"
      onChange={(event) => setTyped(event.target.value)}
      onBlur={commit}
      onKeyDown={(event) => {
        if (event.key === "Enter") commit();
        if (event.key === "Escape" && typed !== null) {
          event.stopPropagation();
          setTyped(null);
        }
      }}
      className={cx(fieldClass(), "h-6 w-full text-table max-md:h-11")}
    />
  );
};
