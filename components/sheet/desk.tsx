import type { ReactNode } from "react";

/** The steel bench: strip above, sheet below; on a phone the areas are tabs at the foot. */
export const Desk = ({ children }: { children: ReactNode }) => (
  <div className="grid h-dvh grid-cols-[auto_auto_minmax(0,1fr)] grid-rows-[var(--fb-strip)_minmax(0,1fr)] [grid-template-areas:'brand_tabs_who'_'sheet_sheet_sheet'] max-md:grid-rows-[52px_minmax(0,1fr)] max-sm:grid-cols-[auto_minmax(0,1fr)] max-sm:grid-rows-[44px_minmax(0,1fr)_auto] max-sm:[grid-template-areas:'brand_who'_'sheet_sheet'_'tabs_tabs'] print:block print:h-auto">
    {children}
  </div>
);
