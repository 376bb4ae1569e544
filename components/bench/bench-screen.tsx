"use client";
import dynamic from "next/dynamic";
import { useState } from "react";
import { Advice } from "@/components/bench/advice";
import {
  BenchContext,
  benchActions,
  makeBenchStore,
  useBench,
  type BenchStart,
} from "@/components/bench/bench-store";
import { BenchTitleBlock } from "@/components/bench/bench-title-block";
import { FirstUse } from "@/components/bench/first-use";
import { LiveLine } from "@/components/bench/live-line";
import { Panel } from "@/components/bench/panel/panel";
import { SaveNotices } from "@/components/bench/save-notices";
import { PartsTable } from "@/components/bench/table/parts-table";
import { ToolBar } from "@/components/bench/tool-bar";
import { useAutosave } from "@/components/bench/use-autosave";
import { useBenchKeys } from "@/components/bench/use-bench-keys";
import { useCompute } from "@/components/bench/use-compute";
import { Sheet } from "@/components/sheet/sheet";

const BenchCanvas = dynamic(
  async () => ({ default: (await import("@/components/bench/canvas/bench-canvas")).BenchCanvas }),
  { ssr: false },
);

type BenchScreenProps = Readonly<{ start: BenchStart; person: Readonly<{ id: string; name: string }> }>;

/** The Bench: the sheet on which a section is drawn, its parts, what to mind, and its figures. */
export const BenchScreen = ({ start, person }: BenchScreenProps) => {
  const [bench] = useState(() => {
    const store = makeBenchStore(start);
    return { store, act: benchActions(store) };
  });
  return (
    <BenchContext.Provider value={bench}>
      <Work person={person} />
    </BenchContext.Provider>
  );
};

const Work = ({ person }: Pick<BenchScreenProps, "person">) => {
  useCompute();
  useAutosave(person.id);
  useBenchKeys();
  const heading = useBench((s) => s.shape?.designation ?? (s.name || "A new drawing"));
  return (
    <Sheet
      heading={`Bench: ${heading}`}
      block={<BenchTitleBlock person={person.name} />}
      className="grid grid-cols-[minmax(0,1fr)_488px] max-xl:grid-cols-[minmax(0,1fr)_452px] max-lg:block"
    >
      <div className="flex min-h-0 min-w-0 flex-col max-lg:block">
        <div className="flex-none max-sm:hidden">
          <ToolBar />
        </div>
        <SaveNotices owner={person.id} />
        <div className="relative min-h-[180px] flex-1 overflow-hidden max-lg:h-[500px] max-sm:h-[320px]">
          <BenchCanvas />
          <div className="max-sm:hidden">
            <FirstUse />
          </div>
        </div>
        <div className="relative max-h-[40dvh] flex-none overflow-auto border-t border-frame max-lg:max-h-none">
          <PartsTable />
        </div>
        <Advice />
      </div>
      <div className="min-h-0 min-w-0 border-l border-frame max-lg:border-t-2 max-lg:border-l-0">
        <Panel />
      </div>
      <LiveLine />
    </Sheet>
  );
};
