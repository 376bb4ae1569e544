"use client";
import Link from "next/link";
import { SymbolOf } from "@/components/display/quantity";
import { When } from "@/components/display/when";
import { Signed } from "@/components/rack/both-figures";
import { percentChange, propertyValue } from "@/components/rack/property-value";
import { cx } from "@/components/ui/cx";
import { RevisionMark, StateChip } from "@/components/ui/marks";
import { PaneHead, Table, Td, Th } from "@/components/ui/table";
import { WaitingDots } from "@/components/ui/waiting";
import { useRevision } from "@/lib/client/revisions";
import type { RevisionItem, RevisionRecord } from "@/lib/schemas/shape";

type RevisionListProps = Readonly<{
  shapeId: string;
  revisions: readonly RevisionItem[];
  shown: RevisionRecord;
  /** The revision laid under the one shown, by ordinal. */
  against: number | null;
  onAgainst: (ordinal: number | null) => void;
}>;

const CHANGE_KEYS = ["mass", "Ix", "Sx", "Zx", "ry"] as const;

/** All revisions, newest first; the change from the one before in per cent; one press lays it under the figure. */
export function RevisionList({ shapeId, revisions, shown, against, onAgainst }: RevisionListProps) {
  const newest = [...revisions].sort((a, b) => b.ordinal - a.ordinal);
  const before = newest.find((r) => r.ordinal < shown.ordinal) ?? null;
  const compared = against ?? before?.ordinal ?? null;
  const other = useRevision(shapeId, compared);
  const otherItem = revisions.find((r) => r.ordinal === compared);
  return (
    <section aria-label="Revisions">
      <PaneHead>Revisions</PaneHead>
      <ul>
        {newest.map((revision) => {
          const here = revision.ordinal === shown.ordinal;
          return (
            <li
              key={revision.ordinal}
              className={cx(
                "grid min-h-10 grid-cols-[40px_minmax(0,1fr)_auto] items-center gap-x-1 border-b border-rule py-1 pr-3 pl-3",
                here && "bg-wash",
              )}
            >
              <RevisionMark letter={revision.letter} />
              <Link
                href={`/rack/${shapeId}?revision=${revision.ordinal}`}
                aria-current={here ? "true" : undefined}
                className="min-w-0 no-underline hover:underline"
              >
                <span className={cx("block truncate", here && "font-bold")}>
                  {revision.note || (revision.ordinal === 1 ? "First issue" : "Without a note")}
                </span>
                <span className="block truncate text-note text-ink-3">
                  {revision.author.name}
                  {revision.checked && `, checked ${revision.checked.by.name}`}
                </span>
              </Link>
              <span className="text-right text-table">
                {revision.state === "released" ? (
                  <When at={revision.released?.at ?? revision.createdAt} />
                ) : (
                  <StateChip state={revision.state} />
                )}
              </span>
            </li>
          );
        })}
      </ul>
      {otherItem && (
        <Table>
          <thead>
            <tr>
              <Th className="pl-3">
                {otherItem.letter} to {shown.letter}
              </Th>
              {CHANGE_KEYS.map((key) => (
                <Th key={key} numeric>
                  <SymbolOf property={key} />
                </Th>
              ))}
            </tr>
          </thead>
          <tbody>
            <tr>
              <Td className="pl-3 text-ink-2">%</Td>
              {CHANGE_KEYS.map((key) => {
                const change = other.data
                  ? percentChange(propertyValue(other.data.computed, key), propertyValue(shown.computed, key))
                  : null;
                return (
                  <Td key={key} numeric>
                    {other.isPending ? <WaitingDots /> : change === null ? "" : <Signed percent={change} />}
                  </Td>
                );
              })}
            </tr>
          </tbody>
        </Table>
      )}
      {revisions.length > 1 && (
        <p className="no-print flex flex-wrap items-center gap-x-3 gap-y-1 border-b border-frame px-3 py-1.5 text-note text-ink-2">
          {against === null ? "Lay under the figure:" : "Laid under the figure in double dots:"}
          {newest
            .filter((r) => r.ordinal !== shown.ordinal)
            .map((r) => (
              <button
                key={r.ordinal}
                type="button"
                aria-pressed={against === r.ordinal}
                className={cx("link min-h-6", against === r.ordinal && "font-bold text-ink")}
                onClick={() => onAgainst(against === r.ordinal ? null : r.ordinal)}
              >
                revision {r.letter}
              </button>
            ))}
        </p>
      )}
    </section>
  );
}
