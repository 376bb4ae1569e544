"use client";
import { SymbolOf } from "@/components/display/quantity";
import { When } from "@/components/display/when";
import { Signed } from "@/components/rack/both-figures";
import { percentChange, propertyValue } from "@/components/rack/property-value";
import { commonScale, RowSilhouette } from "@/components/rack/silhouette";
import { cx } from "@/components/ui/cx";
import { RevisionMark, StateChip } from "@/components/ui/marks";
import { UnsymmetricalSign } from "@/components/ui/signs";
import type { RevisionRecord, ShapeSheet } from "@/lib/schemas/shape";

export type WaitingItem = Readonly<{ sheet: ShapeSheet; before: RevisionRecord | null }>;

const CHANGE_KEYS = ["mass", "Ix", "Sx", "Zx", "ry"] as const;

const sizeOf = ({ revision: { computed } }: ShapeSheet) => ({
  depth: computed.extents.yMax - computed.extents.yMin,
  width: computed.extents.xMax - computed.extents.xMin,
});

type CheckListRowsProps = Readonly<{
  items: readonly WaitingItem[];
  inHand: string | null;
  onTakeInHand: (id: string) => void;
}>;

/** What waits, each with its outline, author, time and the change from the revision before. */
export function CheckListRows({ items, inHand, onTakeInHand }: CheckListRowsProps) {
  const scale = commonScale(
    items.map(({ sheet }) => sizeOf(sheet)),
    50,
    60,
  );
  return (
    <ul>
      {items.map(({ sheet, before }) => {
        const { revision } = sheet;
        const here = sheet.id === inHand;
        return (
          <li key={sheet.id} className="border-b border-rule">
            <button
              type="button"
              aria-current={here ? "true" : undefined}
              onClick={() => onTakeInHand(sheet.id)}
              className={cx(
                "grid w-full grid-cols-[54px_minmax(0,1fr)] gap-x-3 px-2.5 py-2 text-left text-table focus-visible:-outline-offset-2",
                here ? "bg-wash shadow-[inset_3px_0_0_var(--fb-oxide-ink)]" : "hover:bg-wash",
              )}
            >
              <span className="self-end">
                <RowSilhouette
                  drawing={revision.drawing}
                  pxPerMm={scale}
                  width={50}
                  height={60}
                  inHand={here}
                />
              </span>
              <span className="min-w-0">
                <span className="flex flex-wrap items-center gap-1.5">
                  <b className="text-body">{sheet.designation}</b>
                  <RevisionMark letter={revision.letter} />
                  <StateChip state={revision.state} />
                  {revision.computed.unsymmetrical && <UnsymmetricalSign />}
                  <span className="flex-1" />
                  <span className="text-note text-ink-3">bay {sheet.bay.ordinal}</span>
                </span>
                <span className="block truncate font-[560]">{revision.note || "First issue"}</span>
                <span className="block text-ink-2">
                  {revision.author.name}
                  {revision.submitted && (
                    <>
                      , <When at={revision.submitted.at} minute />
                    </>
                  )}
                </span>
                {before === null ? (
                  <span className="block text-note text-ink-3">no earlier revision to lay beside it</span>
                ) : (
                  <span className="mt-1 flex flex-wrap gap-x-3 font-num">
                    {CHANGE_KEYS.map((key) => {
                      const change = percentChange(
                        propertyValue(before.computed, key),
                        propertyValue(revision.computed, key),
                      );
                      return (
                        change !== null && (
                          <span key={key}>
                            <SymbolOf property={key} className="font-ui text-ink-2" />{" "}
                            <Signed percent={change} />
                          </span>
                        )
                      );
                    })}
                    <span className="text-ink-3">%</span>
                  </span>
                )}
              </span>
            </button>
          </li>
        );
      })}
    </ul>
  );
}
