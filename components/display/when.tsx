const DAY = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short", year: "numeric" });
const MINUTE = new Intl.DateTimeFormat("en-GB", {
  day: "numeric",
  month: "short",
  year: "numeric",
  hour: "2-digit",
  minute: "2-digit",
});

/** A moment in the reader's own time: the day, or the minute where that matters. */
export const When = ({ at, minute }: { at: string; minute?: boolean }) => (
  // The server writes its own zone first; the browser puts the reader's in its place.
  <time dateTime={at} suppressHydrationWarning className="whitespace-nowrap">
    {(minute ? MINUTE : DAY).format(new Date(at))}
  </time>
);
