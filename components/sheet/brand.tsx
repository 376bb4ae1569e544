import { cx } from "@/components/ui/cx";

export const BrandMark = ({ className }: { className?: string }) => (
  <svg viewBox="0 0 16 16" aria-hidden className={cx("flex-none", className)}>
    <path fill="var(--fb-ink)" d="M0 3l6 6v4L0 7zM0 9l4 4H0zM16 3l-6 6v4l6-6zM16 9l-4 4h4z" />
    <path fill="var(--fb-oxide)" d="M7 1h2v14H7z" />
  </svg>
);
