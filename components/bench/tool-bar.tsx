"use client";
import type { ReactNode } from "react";
import { AddMenu } from "@/components/bench/add-menu";
import { ArrangeMenu } from "@/components/bench/arrange-menu";
import { FromRack } from "@/components/bench/from-rack";
import { useBench, useBenchActions, type Tool } from "@/components/bench/bench-store";
import { DimensionIcon, HoleIcon, OutlineIcon, PlateIcon, SelectIcon } from "@/components/bench/tool-icons";
import { toolClass } from "@/components/bench/tool-class";
import { Select } from "@/components/ui/select";

type ToolButtonProps = Readonly<{ tool: Tool; keys: string; icon: ReactNode; children: ReactNode }>;

const ToolButton = ({ tool, keys, icon, children }: ToolButtonProps) => {
  const on = useBench((s) => s.tool === tool);
  const act = useBenchActions();
  return (
    <button
      type="button"
      aria-pressed={on}
      aria-keyshortcuts={keys}
      className={toolClass(on)}
      onClick={() => act.use(tool)}
    >
      {icon}
      {children}
      <kbd aria-hidden className="font-num text-note text-ink-3 max-xl:hidden">
        {keys}
      </kbd>
    </button>
  );
};

const Rule = () => <span aria-hidden className="mx-1 my-2 w-px flex-none bg-rule max-md:hidden" />;

const SNAPS = [
  { value: "1", label: "edges, 1 mm" },
  { value: "5", label: "edges, 5 mm" },
  { value: "10", label: "edges, 10 mm" },
  { value: "0", label: "edges only" },
  { value: "off", label: "off" },
] as const;

/** Tools, arranging, undo and snapping along the head of the sheet. */
export const ToolBar = () => {
  const act = useBenchActions();
  const canUndo = useBench((s) => s.history.past.length > 0);
  const canRedo = useBench((s) => s.history.future.length > 0);
  const snap = useBench((s) => (s.snapping ? String(s.grid) : "off"));
  const chosen = SNAPS.find((s) => s.value === snap)?.value ?? "1";
  return (
    <div
      role="toolbar"
      aria-label="Tools"
      className="flex h-9 min-w-0 flex-none items-stretch overflow-x-auto overflow-y-hidden border-b border-frame max-md:h-11"
    >
      <ToolButton tool="select" keys="S" icon={<SelectIcon />}>
        Select
      </ToolButton>
      <ToolButton tool="plate" keys="P" icon={<PlateIcon />}>
        Plate
      </ToolButton>
      <FromRack />
      <ToolButton tool="outline" keys="O" icon={<OutlineIcon />}>
        Outline
      </ToolButton>
      <ToolButton tool="hole" keys="H" icon={<HoleIcon />}>
        Hole
      </ToolButton>
      <ToolButton tool="dimension" keys="D" icon={<DimensionIcon />}>
        Dimension
      </ToolButton>
      <Rule />
      <AddMenu />
      <ArrangeMenu />
      <Rule />
      <button
        type="button"
        className={toolClass(false)}
        aria-disabled={!canUndo}
        aria-keyshortcuts="Control+Z"
        onClick={() => canUndo && act.undo()}
      >
        Undo
      </button>
      <button
        type="button"
        className={toolClass(false)}
        aria-disabled={!canRedo}
        aria-keyshortcuts="Control+Y"
        onClick={() => canRedo && act.redo()}
      >
        Redo
      </button>
      <span className="flex-1" />
      <span className="flex flex-none items-center gap-1.5 pr-2 pl-2 text-table text-ink-2 max-md:hidden">
        <Select
          aria-label="Snap"
          value={chosen}
          choices={SNAPS}
          onChange={(value) =>
            value === "off" ? act.set({ snapping: false }) : act.set({ snapping: true, grid: Number(value) })
          }
          className="h-6 bg-transparent px-1 text-table"
        />
      </span>
    </div>
  );
};
