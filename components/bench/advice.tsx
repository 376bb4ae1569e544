"use client";
import { useState, type ReactNode } from "react";
import { useBench, useBenchActions } from "@/components/bench/bench-store";
import { StarterEditDialog } from "@/components/bench/starter-dialog";
import { Count } from "@/components/display/quantity";
import { Button } from "@/components/ui/button";
import { NoteSign, RefusedSign, UnsymmetricalSign, WarningSign } from "@/components/ui/signs";
import { mendFloating, mendOverlap, overlappingWith, type Mend } from "@/lib/drawing/mend";
import type { Drawing } from "@/lib/drawing/schema";
import { starterOfPart } from "@/lib/drawing/starters/apply-starter";
import { jointOf } from "@/lib/figure/welds";

type LineProps = Readonly<{ sign: ReactNode; head: string; children?: ReactNode; deeds?: ReactNode }>;

const Line = ({ sign, head, children, deeds }: LineProps) => (
  <li className="flex min-h-6 items-start gap-2 px-3 py-0.5 text-table leading-5">
    <span className="mt-0.5">{sign}</span>
    <span className="min-w-0 flex-1 text-ink-2">
      <b className="font-[640] text-ink">{head}</b> {children}
    </span>
    <span className="flex flex-none gap-1">{deeds}</span>
  </li>
);

const mendsFor = (drawing: Drawing, code: string, parts: readonly string[]): Mend[] => {
  if (code.startsWith("overlap.")) return mendOverlap(drawing, parts.slice(0, 2));
  if (code === "parts.floating" || code === "parts.pointContact")
    return mendFloating(drawing, parts.slice(0, code === "parts.floating" ? undefined : 1));
  return [];
};

/** What is wrong, what to mind, what was assumed: under the parts, each with the one click that mends it. */
export const Advice = () => {
  const act = useBenchActions();
  const drawing = useBench((s) => s.history.now);
  const faults = useBench((s) => s.faults);
  const figures = useBench((s) => s.figures);
  const engineFault = useBench((s) => s.engineFault);
  const picked = useBench((s) => s.picked);
  const [editing, setEditing] = useState(false);
  const starter = picked[0] ? starterOfPart(drawing, picked[0]) : null;
  const mendButtons = (mends: readonly Mend[]) =>
    mends.map((mend) => (
      <Button key={mend.label} size="small" onClick={() => act.edit(() => mend.drawing)}>
        {mend.label}
      </Button>
    ));
  const open = (figures?.section.contacts ?? []).filter((c) => {
    const joint = jointOf(drawing.joints, c.parts);
    return !joint || (joint.kind === "fillet" && joint.size === null);
  });
  const p = figures?.properties;
  return (
    <ul
      aria-label="Advice"
      className="max-h-40 flex-none overflow-auto border-t border-frame py-[3px] max-lg:max-h-none"
    >
      {engineFault && (
        <Line sign={<RefusedSign />} head="The program is at fault.">
          {engineFault}
        </Line>
      )}
      {faults.map((fault, i) => (
        <Line
          key={`${fault.code}-${i}`}
          sign={<RefusedSign />}
          head="Not computed."
          deeds={
            fault.code.startsWith("overlap.")
              ? mendButtons(
                  fault.part === undefined
                    ? []
                    : mendOverlap(drawing, [fault.part, ...overlappingWith(drawing, fault.part).slice(0, 1)]),
                )
              : fault.part && (
                  <Button size="small" onClick={() => fault.part && act.pick([fault.part])}>
                    show it
                  </Button>
                )
          }
        >
          {fault.detail} The figures beside are those before.
        </Line>
      ))}
      {drawing.parts.length === 0 && (
        <Line sign={<NoteSign />} head="Nothing is drawn yet, so nothing is computed.">
          Figures stand here with the first part, and change while you type.
        </Line>
      )}
      {p?.unsymmetrical && (
        <Line sign={<UnsymmetricalSign />} head="Unsymmetrical.">
          x–x is not a principal axis: under <i>M</i>
          <sub>x</sub> alone the true extreme stress is{" "}
          <Count value={(p.unsymmetrical.factorX - 1) * 100} decimals={1} /> % above <i>M/S</i>
          <sub>x</sub>.
        </Line>
      )}
      {p?.warnings.map((w, i) => (
        <Line
          key={`${w.code}-${i}`}
          sign={<WarningSign />}
          head={headOf(w.code)}
          deeds={
            <>
              {mendButtons(mendsFor(drawing, w.code, w.parts))}
              {w.parts.length > 0 && (
                <Button size="small" onClick={() => act.pick(w.parts)}>
                  show
                </Button>
              )}
            </>
          }
        >
          {w.detail}
        </Line>
      ))}
      {open.length > 0 && (
        <Line
          sign={<NoteSign />}
          head={open.length === 1 ? "One weld has no size yet." : `${open.length} welds have no size yet.`}
          deeds={
            <Button
              size="small"
              onClick={() => document.getElementById("joints")?.scrollIntoView({ block: "nearest" })}
            >
              give sizes
            </Button>
          }
        >
          Between{" "}
          {open
            .slice(0, 6)
            .map((c) => c.parts.map((id) => drawing.parts.findIndex((part) => part.id === id) + 1).join("–"))
            .join(", ")}
          : they may stay open on a draft.
        </Line>
      )}
      {starter && (
        <Line
          sign={<NoteSign />}
          head={`${starter.starter.name}.`}
          deeds={
            <Button size="small" onClick={() => setEditing(true)}>
              its sizes
            </Button>
          }
        >
          The part in hand belongs to a starter; its form still holds.
        </Line>
      )}
      {editing && starter && <StarterEditDialog placed={starter} onClose={() => setEditing(false)} />}
    </ul>
  );
};

const headOf = (code: string): string => {
  if (code.startsWith("overlap.")) return "Overlap.";
  if (code === "parts.floating") return "Floating.";
  if (code === "parts.pointContact") return "Touching in a point.";
  if (code.startsWith("cutout.")) return "Hole.";
  return "Mind.";
};
