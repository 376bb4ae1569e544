"use client";
import { useState } from "react";
import { useBenchActions } from "@/components/bench/bench-store";
import { MaterialsDialog } from "@/components/bench/materials-dialog";
import { StarterDialog } from "@/components/bench/starter-dialog";
import { toolClass } from "@/components/bench/tool-class";
import { Menu, MenuItem, MenuRule } from "@/components/ui/menu";
import { partFor } from "@/lib/drawing/add-row";
import { addParts } from "@/lib/drawing/edit-parts";
import { PartShape } from "@/lib/drawing/schema";
import { partBox } from "@/lib/drawing/placed-part";
import type { Family } from "@/lib/profiles/families";
import { FIRST_DIMENSIONS, PROFILE_NAME } from "@/lib/profiles/family-fields";

/** What else can be set on the sheet: starters, rounds, profiles by family, materials. */
export const AddMenu = () => {
  const act = useBenchActions();
  const [open, setOpen] = useState<"starter" | "materials" | null>(null);
  const addProfile = (family: Family) => {
    const shape = PartShape.parse({ kind: "profile", family, dimensions: FIRST_DIMENSIONS[family] });
    const made = partFor(act.drawing(), shape);
    const box = partBox({ ...made, at: { x: 0, y: 0 } });
    const part = {
      ...made,
      name: PROFILE_NAME[family],
      at: { x: made.at.x, y: made.at.y + (box?.yMax ?? 0) },
    };
    act.edit((d) => addParts(d, [part]));
    act.pick([part.id]);
  };
  return (
    <>
      <Menu
        trigger={
          <button type="button" className={toolClass(false)}>
            Add
          </button>
        }
      >
        <MenuItem onSelect={() => setOpen("starter")}>A starter…</MenuItem>
        <MenuItem keys="T" onSelect={() => act.use("round")}>
          Round or tube
        </MenuItem>
        <MenuRule />
        {(Object.keys(PROFILE_NAME) as Family[]).map((family) => (
          <MenuItem key={family} onSelect={() => addProfile(family)}>
            {PROFILE_NAME[family]}
          </MenuItem>
        ))}
        <MenuRule />
        <MenuItem onSelect={() => setOpen("materials")}>Materials…</MenuItem>
      </Menu>
      {open === "starter" && <StarterDialog onClose={() => setOpen(null)} />}
      {open === "materials" && <MaterialsDialog onClose={() => setOpen(null)} />}
    </>
  );
};
