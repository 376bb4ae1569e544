"use client";
import { useState } from "react";
import { useBench } from "@/components/bench/bench-store";
import { StarterForm } from "@/components/bench/starter-form";
import { StarterGrid } from "@/components/bench/starter-grid";
import { usePlaceStarter } from "@/components/bench/starter-dialog";
import { STARTERS } from "@/lib/drawing/starters/starters";
import type { Starter } from "@/lib/drawing/starters/starter";

/** An empty sheet: starters to begin with; it steps aside as soon as something is drawn or a tool is taken. */
export const FirstUse = () => {
  const empty = useBench((s) => s.history.now.parts.length === 0);
  const tool = useBench((s) => s.tool);
  const [starter, setStarter] = useState<Starter>(STARTERS[0] as Starter); // safe: the list is not empty
  const place = usePlaceStarter();
  if (!empty || tool !== "select") return null;
  return (
    <div className="absolute inset-x-3 top-8 z-10 mx-auto max-h-[calc(100%-40px)] max-w-[760px] overflow-auto border-2 border-ink bg-sheet">
      <p className="border-b border-rule px-4 py-2.5">
        <b>An empty sheet.</b>{" "}
        <span className="text-ink-2">
          Start from one of these, draw, or type sizes in the table: a starter is plates with sizes, and stays
          yours to change.
        </span>
      </p>
      <StarterGrid chosen={starter} onChoose={setStarter} />
      <div className="border-t border-frame p-4">
        <StarterForm
          key={starter.id}
          starter={starter}
          action="Put on the sheet"
          onDone={(values) => place(starter, values)}
        />
      </div>
    </div>
  );
};
