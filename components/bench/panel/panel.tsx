"use client";
import { useState } from "react";
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
import { axisLetter } from "@/lib/units/notation";

/** The figures of what is drawn, in blocks that fold; stale ones are greyed until the new ones are there. */
export const Panel = () => {
  const figures = useBench((s) => s.figures);
  const stale = useBench((s) => s.figures !== null && s.figuresOf !== s.history.now);
  const faulty = useBench((s) => s.faults.length > 0);
  const p = figures?.properties ?? null;
  return (
    <div
      aria-busy={stale || undefined}
      className={cx(
        (stale || faulty) && "[&_.figure]:text-ink-3",
        "relative h-full overflow-auto max-lg:h-auto",
      )}
    >
      <Block
        id="properties"
        title="Properties"
        note={
          stale
            ? "computing"
            : faulty
              ? "of the last state that could be computed"
              : figures?.gross
                ? "of the net section, from datum 0, 0"
                : "of the gross section, from datum 0, 0"
        }
      >
        <Overview p={p} />
        <AboutAxes p={p} />
        <MoreProperties p={p} />
      </Block>
      {!figures && <YourDrawings />}
      {figures && (
        <>
          <TabulationBlock />
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
    </div>
  );
};

const TabulationBlock = () => {
  const figures = useBench((s) => s.figures);
  const { settings } = useDisplay();
  const [axis, setAxis] = useState<"x" | "y">("x");
  if (!figures) return null;
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
