"use client";
import { useSyncExternalStore } from "react";

const never = () => () => undefined;

/** The person's time zone; UTC while the page of the server is still shown. */
export const useTimeZone = (): string =>
  useSyncExternalStore(
    never,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    () => "UTC",
  );

type MomentProps = Readonly<{ at: string; show: "time" | "day" | "both" }>;

const PARTS = {
  time: { hour: "2-digit", minute: "2-digit", second: "2-digit" },
  day: { day: "numeric", month: "short", year: "numeric" },
  both: { day: "numeric", month: "short", year: "numeric", hour: "2-digit", minute: "2-digit" },
} as const;

/** A moment as the person's clock shows it. */
export function Moment({ at, show }: MomentProps) {
  const timeZone = useTimeZone();
  return (
    <time dateTime={at}>
      {new Intl.DateTimeFormat("en-GB", { ...PARTS[show], timeZone }).format(new Date(at))}
    </time>
  );
}

const STEPS = [
  { below: 60, size: 1, name: null },
  { below: 3600, size: 60, name: "min" },
  { below: 86_400, size: 3600, name: "h" },
] as const;

/** How long ago, in the largest unit that fits; beyond two days the words are days. */
export const agoWords = (at: string | null, now: number): string => {
  if (at === null) return "never";
  const seconds = Math.max(0, (now - Date.parse(at)) / 1000);
  const step = STEPS.find(({ below }) => seconds < below);
  if (step) return step.name === null ? "now" : `${Math.floor(seconds / step.size)} ${step.name} ago`;
  const days = Math.floor(seconds / 86_400);
  return days === 1 ? "yesterday" : `${days} days ago`;
};
