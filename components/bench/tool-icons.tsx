import type { ReactNode } from "react";

const Icon = ({ children }: { children: ReactNode }) => (
  <svg
    width="16"
    height="16"
    viewBox="0 0 16 16"
    fill="none"
    stroke="currentColor"
    strokeWidth="1.2"
    aria-hidden
  >
    {children}
  </svg>
);

export const SelectIcon = () => (
  <Icon>
    <path d="M3 2v11l3.2-3 2 4.2 1.6-.8-2-4.1h4.2z" fill="currentColor" stroke="none" />
  </Icon>
);
export const PlateIcon = () => (
  <Icon>
    <path d="M1.5 5.5h13v5h-13zM3 10.5l4-5M7 10.5l4-5M11 10.5l3-3.8" />
  </Icon>
);
export const RackIcon = () => (
  <Icon>
    <path d="M2.5 2.5h11v2.2H9.2v6.6h4.3v2.2h-11v-2.2h4.3V4.7H2.5z" />
  </Icon>
);
export const OutlineIcon = () => (
  <Icon>
    <path d="M3 13V6l5-3.5L13 6l-3 7z" />
    <path d="M1.8 11.8h2.4v2.4H1.8zM6.8 1.3h2.4v2.4H6.8z" fill="currentColor" stroke="none" />
  </Icon>
);
export const HoleIcon = () => (
  <Icon>
    <circle cx="8" cy="8" r="4.5" />
    <path d="M8 1v14M1 8h14" strokeDasharray="4 1.5 1 1.5" />
  </Icon>
);
export const DimensionIcon = () => (
  <Icon>
    <path d="M2 3v11M14 3v11M2 7h12M.8 8.2l2.4-2.4M12.8 8.2l2.4-2.4" />
  </Icon>
);
