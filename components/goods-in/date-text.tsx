"use client";
import { useMedia } from "@/components/sheet/use-media";

const MONTHS = ["Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"];
const two = (n: number) => String(n).padStart(2, "0");

/** A moment as the title block writes it: day and year in the person's own time zone once the page is alive, UTC before. */
export function DateText({ iso, time = false }: Readonly<{ iso: string; time?: boolean }>) {
  const alive = useMedia("all");
  const at = new Date(iso);
  const [d, m, y] = alive
    ? [at.getDate(), at.getMonth(), at.getFullYear()]
    : [at.getUTCDate(), at.getUTCMonth(), at.getUTCFullYear()];
  const [h, min] = alive ? [at.getHours(), at.getMinutes()] : [at.getUTCHours(), at.getUTCMinutes()];
  return (
    <time dateTime={iso}>
      {d} {MONTHS[m]} {y}
      {time && `, ${two(h)}:${two(min)}`}
    </time>
  );
}
