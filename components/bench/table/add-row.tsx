"use client";
import { useState } from "react";
import { useBenchActions, useBenchContext } from "@/components/bench/bench-store";
import { useFromRack } from "@/components/bench/use-from-rack";
import { useLengths } from "@/components/bench/use-lengths";
import { fieldClass } from "@/components/ui/field";
import { Kbd } from "@/components/ui/marks";
import { RefusedSign } from "@/components/ui/signs";
import { cx } from "@/components/ui/cx";
import { parseRow, partFor } from "@/lib/drawing/add-row";
import { addParts } from "@/lib/drawing/edit-parts";

/** Adds a part by what is typed: sizes for a plate or a tube, else a designation from the Rack. */
export const AddRow = ({ first }: { first: boolean }) => {
  const { store } = useBenchContext();
  const act = useBenchActions();
  const { options } = useLengths();
  const fromRack = useFromRack();
  const [text, setText] = useState("");
  const [refused, setRefused] = useState<string | null>(null);
  const [looking, setLooking] = useState(false);

  const add = async () => {
    const typed = text.trim();
    if (!typed || looking) return;
    const shape = parseRow(typed, options);
    if (shape.ok) {
      const { picked, history } = store.getState();
      const on = picked.length === 1 ? picked[0] : undefined;
      const onSolid = history.now.parts.some((p) => p.id === on && p.cutout !== true) ? on : undefined;
      const part = partFor(history.now, shape.value, onSolid);
      act.edit((d) => addParts(d, [part]));
      act.pick([part.id]);
      setText("");
      setRefused(null);
      return;
    }
    if (!/[a-z]/i.test(typed.replace(/[x×]/gi, ""))) return setRefused(shape.error.detail);
    setLooking(true);
    const found = await fromRack.byDesignation(typed);
    setLooking(false);
    setRefused(found.ok ? null : found.error.detail);
    if (found.ok) setText("");
  };

  return (
    <div className="flex flex-wrap items-center gap-x-2 gap-y-1 text-ink-2">
      <label className="flex flex-wrap items-center gap-x-2">
        <span>{first ? "Add the first row: type" : "Add a row: type"}</span>
        <input
          type="text"
          value={text}
          data-add-row
          placeholder="420x36"
          autoComplete="off"
          spellCheck={false}
          aria-invalid={refused !== null || undefined}
          aria-busy={looking || undefined}
          onChange={(event) => {
            setText(event.target.value);
            setRefused(null);
          }}
          onKeyDown={(event) => {
            if (event.key === "Enter") {
              event.preventDefault();
              void add();
            }
            if (event.key === "Escape" && text) {
              event.stopPropagation();
              setText("");
              setRefused(null);
            }
          }}
          className={cx(
            fieldClass({ refused: refused !== null }),
            "h-6 w-40 font-num text-table max-md:h-11",
          )}
        />
      </label>
      <span className="max-lg:hidden">
        <Kbd>420x36</Kbd> is a plate, <Kbd>Ø219.1x8</Kbd> a tube, else a designation from the Rack
      </span>
      {looking && <span className="text-note text-ink-3">looking it up on the Rack</span>}
      {refused && (
        <span role="alert" className="flex gap-1.5 text-note text-oxide-ink">
          <RefusedSign className="mt-px" /> {refused}
        </span>
      )}
    </div>
  );
};
