"use client";
import { useState } from "react";
import { useBench, useBenchActions } from "@/components/bench/bench-store";
import { toolClass } from "@/components/bench/tool-class";
import { QuantityField } from "@/components/display/quantity-field";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Field } from "@/components/ui/field";
import { Menu, MenuItem, MenuRule } from "@/components/ui/menu";
import {
  alignParts,
  arrayParts,
  mirrorParts,
  stackParts,
  turnParts,
  type AlignTo,
} from "@/lib/drawing/arrange-parts";
import { groupParts, lockParts, ungroupParts, wholeGroups } from "@/lib/drawing/edit-parts";
import { boxOfParts } from "@/lib/drawing/placed-part";
import type { Drawing } from "@/lib/drawing/schema";

const ALIGN: readonly (readonly [AlignTo, string])[] = [
  ["left", "Align left edges"],
  ["centre", "Align on one upright line"],
  ["right", "Align right edges"],
  ["top", "Align tops"],
  ["middle", "Align on one level line"],
  ["bottom", "Align undersides"],
];

/** Aligning, stacking, mirroring, turning, copies in a row, groups, locks: of the parts in hand. */
export const ArrangeMenu = () => {
  const act = useBenchActions();
  const picked = useBench((s) => s.picked);
  const drawing = useBench((s) => s.history.now);
  const [open, setOpen] = useState<"array" | "turn" | null>(null);
  const whole = wholeGroups(drawing, picked);
  const none = picked.length === 0;
  const few = picked.length < 2;
  const locked = drawing.parts.some((p) => picked.includes(p.id) && p.locked === true);
  const item = (label: string, change: (d: Drawing) => Drawing, off: boolean, keys?: string) => (
    <MenuItem key={label} disabled={off} {...(keys && { keys })} onSelect={() => act.edit(change)}>
      {label}
    </MenuItem>
  );
  return (
    <>
      <Menu
        trigger={
          <button type="button" className={toolClass(false)}>
            Arrange
          </button>
        }
      >
        {ALIGN.map(([to, label]) => item(label, (d) => alignParts(d, picked, to), few))}
        <MenuRule />
        {item("Stack upwards", (d) => stackParts(d, picked, "up"), few)}
        {item("Stack to the right", (d) => stackParts(d, picked, "right"), few)}
        <MenuRule />
        {item("Mirror left to right", (d) => mirrorParts(d, whole, "upright"), none)}
        {item("Mirror top to bottom", (d) => mirrorParts(d, whole, "level"), none)}
        {item("Turn by 90°", (d) => turnParts(d, whole, 90), none)}
        <MenuItem disabled={none} onSelect={() => setOpen("turn")}>
          Turn by an angle…
        </MenuItem>
        <MenuItem disabled={none} onSelect={() => setOpen("array")}>
          Copies in a row…
        </MenuItem>
        <MenuRule />
        {item("Group", (d) => groupParts(d, whole), few)}
        {item("Ungroup", (d) => ungroupParts(d, whole), none)}
        {item(locked ? "Unlock" : "Lock the place", (d) => lockParts(d, whole, !locked), none)}
      </Menu>
      {open === "array" && <ArrayDialog ids={whole} onClose={() => setOpen(null)} />}
      {open === "turn" && <TurnDialog ids={whole} onClose={() => setOpen(null)} />}
    </>
  );
};

type IdsDialogProps = Readonly<{ ids: readonly string[]; onClose: () => void }>;

const ArrayDialog = ({ ids, onClose }: IdsDialogProps) => {
  const act = useBenchActions();
  const box = boxOfParts(act.drawing(), ids);
  const [copies, setCopies] = useState(1);
  const [x, setX] = useState(box ? box.xMax - box.xMin : 100);
  const [y, setY] = useState(0);
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Copies in a row"
      text="Each copy is moved by the step once more than the one before."
      actions={
        <Button
          kind="main"
          onClick={() => {
            const made = arrayParts(act.drawing(), ids, copies, { x, y });
            act.edit(() => made.drawing);
            act.pick(made.ids);
            onClose();
          }}
        >
          Make the copies
        </Button>
      }
    >
      <div className="flex flex-wrap gap-4">
        <Field label="Copies">
          {(aria) => (
            <QuantityField
              {...aria}
              bare
              dimension="ratio"
              value={copies}
              refuse={(v) =>
                Number.isInteger(v) && v >= 1 && v <= 100 ? null : "A whole number from 1 to 100."
              }
              onCommit={(v) => v !== null && setCopies(v)}
            />
          )}
        </Field>
        <Field label="Step to the right">
          {(aria) => <QuantityField {...aria} value={x} onCommit={(v) => v !== null && setX(v)} />}
        </Field>
        <Field label="Step upwards">
          {(aria) => <QuantityField {...aria} value={y} onCommit={(v) => v !== null && setY(v)} />}
        </Field>
      </div>
    </Dialog>
  );
};

const TurnDialog = ({ ids, onClose }: IdsDialogProps) => {
  const act = useBenchActions();
  const [deg, setDeg] = useState(45);
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Turn by an angle"
      text="About the middle of the parts in hand; anticlockwise is positive."
      actions={
        <Button
          kind="main"
          onClick={() => {
            act.edit((d) => turnParts(d, ids, deg));
            onClose();
          }}
        >
          Turn
        </Button>
      }
    >
      <Field label="Angle">
        {(aria) => (
          <QuantityField
            {...aria}
            dimension="angle"
            value={deg}
            refuse={(v) => (Math.abs(v) <= 360 ? null : "From −360 to 360 degrees.")}
            onCommit={(v) => v !== null && setDeg(v)}
          />
        )}
      </Field>
    </Dialog>
  );
};
