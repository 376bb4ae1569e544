import type { ReactNode } from "react";
import { BrandMark } from "@/components/sheet/brand";

type PlainSheetProps = Readonly<{ head: string; children: ReactNode; actions?: ReactNode }>;

/** A sheet without an area: what went wrong or was not found, what is safe, what to do. */
export const PlainSheet = ({ head, children, actions }: PlainSheetProps) => (
  <div className="grid h-full min-h-0 p-2 [grid-area:sheet] max-md:p-0">
    <main className="grid min-h-0 content-center justify-items-center border border-frame bg-sheet p-6">
      <div className="w-full max-w-xl border-2 border-frame">
        <div className="flex items-center gap-2.5 border-b border-frame bg-panel px-3 py-2 text-lead font-bold">
          <BrandMark className="size-5" />
          Flitchbook
        </div>
        <div className="px-3 py-3">
          <h1 className="text-title font-bold">{head}</h1>
          <div className="mt-1 text-ink-2">{children}</div>
          {actions && <div className="mt-4 flex flex-wrap gap-2">{actions}</div>}
        </div>
      </div>
    </main>
  </div>
);
