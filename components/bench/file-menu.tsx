"use client";
import { useRef, useState } from "react";
import { useBench, useBenchActions, useBenchContext } from "@/components/bench/bench-store";
import { DrawingsDialog } from "@/components/bench/drawings-dialog";
import { drawingFromText, handOver } from "@/components/bench/hand-over";
import { useLengths } from "@/components/bench/use-lengths";
import { Button } from "@/components/ui/button";
import { Menu, MenuItem, MenuRule } from "@/components/ui/menu";
import { pasteClip } from "@/lib/drawing/clip";

/** Drawings and what is handed over. */
export const FileMenu = () => {
  const { store } = useBenchContext();
  const act = useBenchActions();
  const { formatLength } = useLengths();
  const figures = useBench((s) => s.figures !== null);
  const [open, setOpen] = useState(false);
  const file = useRef<HTMLInputElement>(null);
  const bring = async (chosen: File | undefined) => {
    if (!chosen) return;
    const read = drawingFromText(await chosen.text());
    if (typeof read === "string") return act.say(read);
    const pasted = pasteClip(act.drawing(), read, { x: 0, y: 0 });
    act.edit(() => pasted.drawing);
    act.pick(pasted.ids);
  };
  return (
    <>
      <Menu align="end" trigger={<Button className="h-auto">Drawings</Button>}>
        <MenuItem onSelect={() => setOpen(true)}>Your drawings…</MenuItem>
        <MenuItem onSelect={() => window.location.assign("/bench")}>New drawing</MenuItem>
        <MenuItem onSelect={() => file.current?.click()}>Bring in a drawing file…</MenuItem>
        <MenuRule />
        <MenuItem onSelect={() => handOver.json(store.getState())}>Export the drawing, JSON</MenuItem>
        <MenuItem disabled={!figures} onSelect={() => handOver.svg(store.getState(), formatLength)}>
          Export the figure, SVG
        </MenuItem>
        <MenuItem disabled={!figures} onSelect={() => handOver.csv(store.getState())}>
          Export the figures, CSV
        </MenuItem>
        <MenuItem
          disabled={!figures}
          onSelect={() =>
            void handOver.copyFigures(store.getState()).then(
              () => act.say("Figures copied"),
              () => act.say("The browser did not let the figures onto the clipboard."),
            )
          }
        >
          Copy the figures for a spreadsheet
        </MenuItem>
      </Menu>
      <input
        ref={file}
        type="file"
        accept=".json,application/json"
        aria-label="Drawing file"
        className="hidden"
        onChange={(event) => {
          void bring(event.target.files?.[0]);
          event.target.value = "";
        }}
      />
      {open && <DrawingsDialog onClose={() => setOpen(false)} />}
    </>
  );
};
