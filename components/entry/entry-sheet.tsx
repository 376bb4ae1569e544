import type { ReactNode } from "react";
import { FlitchDrawing } from "@/components/entry/flitch-drawing";
import { ZoneBorder } from "@/components/sheet/sheet";

type EntrySheetProps = Readonly<{
  heading: string;
  /** The title block with the fields. */
  block: ReactNode;
  /** Items of the list of notes. */
  notes: ReactNode;
}>;

/** The sheet in front of the book: the beam, the notes, and the title block that is filled in. */
export const EntrySheet = ({ heading, block, notes }: EntrySheetProps) => (
  <div className="grid min-h-full p-2 max-md:p-0">
    <main className="grid border border-frame bg-sheet max-md:border-x-0">
      <h1 className="sr-only">{heading}</h1>
      <ZoneBorder>
        <div className="relative grid grid-rows-[1fr_auto] content-between overflow-hidden max-md:grid-rows-1">
          <FlitchDrawing className="mx-auto w-full max-w-[1380px] self-start max-md:hidden" />
          <div className="flex flex-row-reverse items-end justify-between gap-8 max-lg:flex-col max-lg:items-stretch max-lg:gap-4">
            {block}
            <section className="max-w-[620px] px-6 pt-4 pb-5 text-ink-2">
              <h2 className="font-bold text-ink">Notes</h2>
              <ol className="list-decimal pl-5 leading-[22px]">{notes}</ol>
            </section>
          </div>
        </div>
      </ZoneBorder>
    </main>
  </div>
);
