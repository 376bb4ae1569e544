import type { ReactNode } from "react";
import { WarningSign } from "@/components/ui/signs";

/** What no figure of this program covers; it stands on every sheet, sizing and export. */
export const NOT_CHECKED =
  "Local, lateral and torsional-flexural buckling, web bearing, connections, fatigue, fire, corrosion, and the factors of any code. Local codes and a licensed engineer decide.";

export const NotChecked = ({ children }: { children?: ReactNode }) => (
  <section className="border-t-2 border-frame px-3 py-2.5 text-[13.5px] leading-[19px]">
    <h2 className="flex items-center gap-2 font-[640]">
      <WarningSign label={null} /> Not checked by this sheet
    </h2>
    <p>{NOT_CHECKED}</p>
    {children && <div className="mt-1 text-note text-ink-2">{children}</div>}
  </section>
);

/** A content hash in groups that can be read out: the first 64 bits. */
export const hashWords = (hash: string): string => (hash.slice(0, 16).match(/.{1,4}/g) ?? []).join(" ");
