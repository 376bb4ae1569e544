import type { ReactNode, SVGProps } from "react";
import { cx } from "@/components/ui/cx";

type SignProps = Readonly<{ className?: string; label?: string | null }>;

function Sign({
  label,
  width = 14,
  className,
  children,
}: SignProps & { width?: number; children: ReactNode } & Pick<SVGProps<SVGSVGElement>, "children">) {
  const named = label ? { role: "img", "aria-label": label } : { "aria-hidden": true };
  return (
    <svg
      width={width}
      height={14}
      viewBox={`0 0 ${width} 14`}
      className={cx("inline-block flex-none align-[-2px]", className)}
      {...named}
    >
      {children}
    </svg>
  );
}

/** The ink of a sign on chalk stays dark in both themes: chalk is bright in both. */
const ON_CHALK = "#15202a";

export const AcceptedSign = ({ label = "accepted", ...rest }: SignProps) => (
  <Sign label={label} {...rest}>
    <path d="M1.5 7.5 5.5 11.5 12.5 2.5" fill="none" stroke="currentColor" strokeWidth="2" />
  </Sign>
);
export const QueriedSign = ({ label = "queried", ...rest }: SignProps) => (
  <Sign label={label} {...rest}>
    <path d="M7 .8 13.2 7 7 13.2.8 7z" fill="var(--fb-chalk)" stroke={ON_CHALK} />
    <path d="M7 3.6v4.2M7 9.2v1.6" stroke={ON_CHALK} strokeWidth="1.8" />
  </Sign>
);
export const RefusedSign = ({ label = "refused", ...rest }: SignProps) => (
  <Sign label={label} {...rest}>
    <rect x=".5" y=".5" width="13" height="13" fill="none" stroke="var(--fb-oxide-ink)" />
    <path d="M3.5 3.5l7 7M10.5 3.5l-7 7" stroke="var(--fb-oxide-ink)" strokeWidth="1.8" />
  </Sign>
);
export const WarningSign = ({ label = "warning", ...rest }: SignProps) => (
  <Sign label={label} width={16} {...rest}>
    <path d="M8 .8 15.4 13.4H.6z" fill="var(--fb-chalk)" stroke={ON_CHALK} />
    <path d="M8 4.6v4M8 10v1.7" stroke={ON_CHALK} strokeWidth="1.7" />
  </Sign>
);
export const NoteSign = ({ label = "note", ...rest }: SignProps) => (
  <Sign label={label} {...rest}>
    <circle cx="7" cy="7" r="6.3" fill="none" stroke="currentColor" />
    <path d="M7 6.2v4.2M7 3.4v1.5" stroke="currentColor" strokeWidth="1.5" />
  </Sign>
);
/** A level line crossed by a tilted one: the axes shown are not principal. */
export const UnsymmetricalSign = ({ label = "unsymmetrical", ...rest }: SignProps) => (
  <Sign label={label} width={20} {...rest}>
    <path d="M0 7H20" stroke="currentColor" strokeWidth="1" />
    <path d="M3 2.2 17 11.8" stroke="currentColor" strokeWidth="2" />
  </Sign>
);
export const FindSign = (props: SignProps) => (
  <Sign label={null} {...props}>
    <circle cx="6" cy="6" r="4.4" fill="none" stroke="currentColor" strokeWidth="1.3" />
    <path d="M9.2 9.2 13 13" stroke="currentColor" strokeWidth="1.6" />
  </Sign>
);
export const ChevronSign = ({ className }: { className?: string }) => (
  <svg width="8" height="6" viewBox="0 0 8 6" aria-hidden className={cx("flex-none", className)}>
    <path d="M1 1l3 3.6L7 1" fill="none" stroke="currentColor" strokeWidth="1.5" />
  </svg>
);

const ARROW = {
  up: "M6 11V2M2.5 5.5 6 2l3.5 3.5",
  down: "M6 1v9M2.5 6.5 6 10l3.5-3.5",
  right: "M1 6h9M6.5 2.5 10 6 6.5 9.5",
  left: "M11 6H2M5.5 2.5 2 6l3.5 3.5",
} as const;
/** Neither font has arrows: they are drawn. */
export const Arrow = ({ to, className }: { to: keyof typeof ARROW; className?: string }) => (
  <svg
    width="12"
    height="12"
    viewBox="0 0 12 12"
    aria-hidden
    className={cx("inline-block flex-none", className)}
  >
    <path d={ARROW[to]} fill="none" stroke="currentColor" strokeWidth="1.3" />
  </svg>
);

export type RightLevel = "none" | "read" | "draft" | "release";
const RIGHT_FILL: Record<RightLevel, string> = {
  none: "border-dotted border-edge",
  read: "border-edge",
  draft: "border-ink bg-[repeating-linear-gradient(-45deg,var(--fb-ink)_0_1px,var(--fb-sheet)_1px_4px)]",
  release: "border-ink bg-ink",
};
/** Open, hatched or solid square; a filled corner marks a right that was granted rather than given by the role. */
export const RightSquare = ({
  level,
  granted,
  label,
}: {
  level: RightLevel;
  granted?: boolean;
  label?: string;
}) => (
  <span
    {...(label ? { role: "img", "aria-label": label } : { "aria-hidden": true })}
    className={cx("relative inline-block size-4 border align-[-3px]", RIGHT_FILL[level])}
  >
    {granted && (
      <span className="absolute -top-[5px] -right-[5px] size-0 border-4 border-transparent border-t-ink border-r-ink" />
    )}
  </span>
);
