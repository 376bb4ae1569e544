"use client";
import { useBenchActions } from "@/components/bench/bench-store";
import { Menu, MenuItem, MenuRule } from "@/components/ui/menu";
import { arrayParts } from "@/lib/drawing/arrange-parts";
import { changePart, lockParts, orderPart, removeParts } from "@/lib/drawing/edit-parts";
import { PART_COUNTS, type DrawingPart } from "@/lib/drawing/schema";
import { MenuChoice } from "@/components/ui/menu";

/** What can be done with one part from its row. */
export const PartMenu = ({ part, item }: { part: DrawingPart; item: number }) => {
  const act = useBenchActions();
  return (
    <Menu
      align="end"
      trigger={
        <button
          type="button"
          aria-label={`More for item ${item}`}
          className="inline-flex size-6 items-center justify-center text-ink-2 hover:bg-wash hover:text-ink max-md:size-11"
        >
          <svg width="14" height="4" viewBox="0 0 14 4" aria-hidden>
            <path d="M1 1h2v2H1zM6 1h2v2H6zM11 1h2v2h-2z" fill="currentColor" />
          </svg>
        </button>
      }
    >
      <MenuItem onSelect={() => act.edit((d) => orderPart(d, part.id, -1))}>Move up</MenuItem>
      <MenuItem onSelect={() => act.edit((d) => orderPart(d, part.id, 1))}>Move down</MenuItem>
      <MenuItem
        onSelect={() => {
          const copy = arrayParts(act.drawing(), [part.id], 1, { x: 20, y: 20 });
          act.edit(() => copy.drawing);
          act.pick(copy.ids);
        }}
      >
        Duplicate
      </MenuItem>
      <MenuItem onSelect={() => act.edit((d) => lockParts(d, [part.id], part.locked !== true))}>
        {part.locked === true ? "Unlock" : "Lock its place"}
      </MenuItem>
      {part.cutout !== true && (
        <>
          <MenuRule />
          <MenuChoice
            label="Counts for"
            value={part.counts ?? "stiffness and mass"}
            choices={PART_COUNTS.map((value) => ({ value, label: value }))}
            onChange={(counts) =>
              act.edit((d) => changePart(d, part.id, (p) => (p.cutout === true ? p : { ...p, counts })))
            }
          />
        </>
      )}
      <MenuRule />
      <MenuItem keys="Del" onSelect={() => act.edit((d) => removeParts(d, [part.id]))}>
        Delete
      </MenuItem>
    </Menu>
  );
};
