"use client";
import { memo, useDeferredValue, useState } from "react";
import { useBench } from "@/components/bench/bench-store";
import { AboutAxes } from "@/components/bench/panel/about-axes";
import { Block } from "@/components/bench/panel/block";
import { CautionsBlock } from "@/components/bench/panel/cautions-block";
import { ChangeBlock } from "@/components/bench/panel/change-block";
import { CompareTable } from "@/components/bench/panel/compare-table";
import { JointsBlock } from "@/components/bench/panel/joints-block";
import { MoreProperties } from "@/components/bench/panel/more-properties";
import { Overview } from "@/components/bench/panel/overview";
import { ShearFieldBlock } from "@/components/bench/panel/shear-field-block";
import { SlendernessBlock } from "@/components/bench/panel/slenderness-block";
import { TabulationTable } from "@/components/bench/panel/tabulation-table";
import { YourDrawings } from "@/components/bench/your-drawings";
import { useDisplay } from "@/components/display/display-provider";
import { cx } from "@/components/ui/cx";
import type { BenchFigures } from "@/lib/client/compute/bench-figures";
import { axisLetter } from "@/lib/units/notation";

const useStale = () => useBench((s) => s.figures !== null && s.figuresOf !== s.history.now);

/** The figures of what is drawn, in blocks that fold; stale ones are greyed until the new ones are there. */
export const Panel = () => {
  // Deferred: a hundred rows of figures give way to the hand that drags.
  const figures = useDeferredValue(useBench((s) => s.figures));
  const stale = useStale();
  const faulty = useBench((s) => s.faults.length > 0);
  return (
    <div
      aria-busy={stale || undefined}
      className={cx(
        (stale || faulty) && "[&_.figure]:text-ink-3",
        "relative h-full overflow-auto max-lg:h-auto",
      )}
    >
      <Blocks figures={figures} />
    </div>
  );
};

const Note = ({ net }: { net: boolean }) => {
  const stale = useStale();
  const faulty = useBench((s) => s.faults.length > 0);
  if (stale) return <>computing</>;
  if (faulty) return <>of the last state that could be computed</>;
  return <>of the {net ? "net" : "gross"} section, from datum 0, 0</>;
};

const Blocks = memo(function Blocks({ figures }: { figures: BenchFigures | null }) {
  const p = figures?.properties ?? null;
  return (
    <>
      <Block
        id="properties"
        title="Properties"
        note={<Note net={figures?.gross !== null && figures !== null} />}
      >
        <Overview p={p} />
        <AboutAxes p={p} />
        <MoreProperties p={p} />
      </Block>
      {!figures && <YourDrawings />}
      {figures && (
        <>
          <TabulationBlock figures={figures} />
          <ChangeBlock p={figures.properties} />
          {figures.picked && (
            <Block id="picked" title="Picked parts" note="as if the others were not there">
              <CompareTable
                columns={[
                  { name: "Picked", properties: figures.picked },
                  { name: "All", properties: figures.properties },
                ]}
              />
            </Block>
          )}
          {figures.gross && (
            <Block id="gross-net" title="Gross and net" note="without and with the holes drawn">
              <CompareTable
                columns={[
                  { name: "Gross", properties: figures.gross },
                  { name: "Net", properties: figures.properties },
                ]}
              />
            </Block>
          )}
          <JointsBlock figures={figures} />
          <ShearFieldBlock figures={figures} />
          <SlendernessBlock facts={figures.slenderness} />
          <CautionsBlock p={figures.properties} />
        </>
      )}
    </>
  );
});

const TabulationBlock = ({ figures }: { figures: BenchFigures }) => {
  const { settings } = useDisplay();
  const [axis, setAxis] = useState<"x" | "y">("x");
  const letter = (a: "x" | "y") => axisLetter(a, settings.notation);
  return (
    <Block
      id="tabulation"
      title="Tabulation"
      note={`parallel axes, about ${letter(axis)}–${letter(axis)}`}
      tools={
        <span role="group" aria-label="Axis of the tabulation" className="inline-flex">
          {(["x", "y"] as const).map((a) => (
            <button
              key={a}
              type="button"
              aria-pressed={axis === a}
              onClick={() => setAxis(a)}
              className={cx(
                "-ml-px h-6 border border-edge px-2 font-num text-note max-md:h-11",
                axis === a && "border-ink bg-ink text-sheet",
              )}
            >
              {letter(a)}–{letter(a)}
            </button>
          ))}
        </span>
      }
    >
      <TabulationTable table={figures.tabulation[axis]} />
    </Block>
  );
};
