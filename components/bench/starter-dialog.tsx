"use client";
import { useState } from "react";
import { useBenchActions } from "@/components/bench/bench-store";
import { StarterForm } from "@/components/bench/starter-form";
import { StarterGrid } from "@/components/bench/starter-grid";
import { Dialog } from "@/components/ui/dialog";
import { changeStarter, placeStarter, type PlacedStarter } from "@/lib/drawing/starters/apply-starter";
import { STARTERS } from "@/lib/drawing/starters/starters";
import type { Starter, StarterValues } from "@/lib/drawing/starters/starter";

/** Puts a starter on the sheet as one step and picks it. */
export const usePlaceStarter = () => {
  const act = useBenchActions();
  return (starter: Starter, values: StarterValues): void => {
    const placed = placeStarter(act.drawing(), starter, values);
    if (!placed.ok) return act.say(placed.error.detail);
    act.edit(() => placed.value.drawing);
    act.pick(placed.value.ids);
    act.say(`${starter.name} is on the sheet`);
  };
};

export const StarterDialog = ({ onClose }: { onClose: () => void }) => {
  const [starter, setStarter] = useState<Starter>(STARTERS[0] as Starter); // safe: the list is not empty
  const place = usePlaceStarter();
  return (
    <Dialog open onOpenChange={onClose} title="Put a starter on the sheet" width="wide">
      <div className="mb-3 border border-frame">
        <StarterGrid chosen={starter} onChoose={setStarter} />
      </div>
      <StarterForm
        key={starter.id}
        starter={starter}
        action="Put on the sheet"
        onDone={(values) => {
          place(starter, values);
          onClose();
        }}
      />
    </Dialog>
  );
};

/** The form of a starter that is on the sheet already, opened from any of its parts. */
export const StarterEditDialog = ({ placed, onClose }: { placed: PlacedStarter; onClose: () => void }) => {
  const act = useBenchActions();
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={placed.starter.name}
      text="Its sizes stay together while its parts keep their places."
      width="wide"
    >
      <StarterForm
        starter={placed.starter}
        values={placed.values}
        action="Change the sizes"
        onDone={(values) => {
          const changed = changeStarter(act.drawing(), placed, values);
          if (changed.ok) act.edit(() => changed.value);
          onClose();
        }}
      />
    </Dialog>
  );
};
