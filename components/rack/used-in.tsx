"use client";
import { useTakes } from "@/lib/client/takes";

/** The jobs that took a shape; one that took another revision than the one shown is named in chalk. */
export function UsedIn({ shapeId, letter }: { shapeId: string; letter: string }) {
  const takes = useTakes(shapeId);
  if (!takes.data || takes.data.length === 0) return null;
  return (
    <section className="px-3 py-[7px] text-table leading-[21px]">
      <h3 className="text-micro text-ink-2">Used in</h3>
      <ul>
        {takes.data.slice(0, 5).map((take) => (
          <li key={take.id} className="truncate">
            <b className="font-[560]">{take.jobNumber}</b>{" "}
            <span className="text-ink-2">{take.jobName || take.pieceMark}, </span>
            <span className="text-ink-2">{take.quantity}</span>
            {take.letter !== letter && <span className="text-chalk-ink"> took rev {take.letter}</span>}
          </li>
        ))}
      </ul>
      {takes.data.length > 5 && (
        <p className="text-note text-ink-3">and {takes.data.length - 5} more on its sheet</p>
      )}
    </section>
  );
}
