import type { ReactNode } from "react";

/** What may be wider than the sheet scrolls by itself, by keyboard too. */
export const ScrollAcross = ({ label, children }: { label: string; children: ReactNode }) => (
  <div role="region" aria-label={label} tabIndex={0} className="overflow-x-auto">
    {children}
  </div>
);
