"use client";
import { useState, type KeyboardEvent } from "react";
import type { Bay } from "@/lib/schemas/bay";
import { RIGHTS, type Right } from "@/lib/schemas/access";
import type { Member } from "@/lib/schemas/member";
import { RIGHT_WORDS, rightInBay } from "@/components/office/member-rights";
import { cx } from "@/components/ui/cx";
import { Kbd } from "@/components/ui/marks";
import { Popover } from "@/components/ui/popover";
import { RightSquare } from "@/components/ui/signs";

const SOURCE = { role: "by role", rack: "granted for the whole Rack", bay: "granted" } as const;

export type RightWish = Readonly<{ bayId: string; right: Right; everywhere: boolean; until: string | null }>;

type RightCellProps = Readonly<{
  member: Member;
  bay: Pick<Bay, "id" | "name">;
  now: number;
  tabIndex: 0 | -1;
  onFocus: () => void;
  onWish: (wish: RightWish) => void;
}>;

/** One square of the matrix: Enter opens the choice, 1 2 3 choose at once. */
export function RightCell({ member, bay, now, tabIndex, onFocus, onWish }: RightCellProps) {
  const [open, setOpen] = useState(false);
  const [everywhere, setEverywhere] = useState(false);
  const [until, setUntil] = useState("");
  const held = rightInBay(member, bay.id, now);

  const choose = (right: Right) => {
    const ends = until === "" ? null : new Date(`${until}T23:59:59Z`).toISOString();
    onWish({ bayId: bay.id, right, everywhere, until: ends });
    setOpen(false);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const right = RIGHTS[Number(event.key) - 1];
    if (!right || event.ctrlKey || event.altKey || event.metaKey) return;
    event.preventDefault();
    choose(right);
  };
  const show = (next: boolean) => {
    setOpen(next);
    setEverywhere(false);
    setUntil(held.from === "bay" && held.until ? held.until.slice(0, 10) : "");
  };
  const label = `${member.name}, ${bay.name}: ${RIGHT_WORDS[held.right]}, ${SOURCE[held.from]}`;

  return (
    <Popover
      label={`Right of ${member.name} in ${bay.name}`}
      open={open}
      onOpenChange={show}
      className="w-[262px] p-0!"
      trigger={
        <button
          type="button"
          data-right-cell
          tabIndex={tabIndex}
          onFocus={onFocus}
          onKeyDown={onKeyDown}
          aria-label={label}
          title={held.until ? `${SOURCE[held.from]}, until ${held.until.slice(0, 10)}` : SOURCE[held.from]}
          className="inline-flex size-[26px] items-center justify-center leading-none max-md:size-11"
        >
          <RightSquare level={held.right} granted={held.from !== "role"} />
        </button>
      }
    >
      <div onKeyDown={onKeyDown} className="py-1">
        {RIGHTS.map((right, index) => (
          <button
            key={right}
            type="button"
            onClick={() => choose(right)}
            aria-pressed={right === held.right}
            className={cx(
              "flex h-[30px] w-full items-center gap-2.5 px-2.5 text-left hover:bg-wash max-md:h-11",
              right === held.right && "bg-wash font-semibold shadow-[inset_3px_0_0_var(--fb-oxide-ink)]",
            )}
          >
            <RightSquare level={right} granted={right !== held.inherited} />
            <span>
              {RIGHT_WORDS[right]}
              {right === held.inherited && (held.from === "rack" ? ", as in the whole Rack" : ", by role")}
            </span>
            <Kbd className="ml-auto">{index + 1}</Kbd>
          </button>
        ))}
        <div className="mt-1 grid gap-2 border-t border-rule px-2.5 pt-2 pb-1 text-table">
          <label className="flex items-center gap-2.5">
            <input
              type="checkbox"
              checked={everywhere}
              onChange={(event) => setEverywhere(event.target.checked)}
              className="size-4 accent-ink"
            />
            the same in all bays
          </label>
          <label className="flex items-center gap-2.5">
            until (empty: it stays)
            <input
              type="date"
              value={until}
              min={new Date(now).toISOString().slice(0, 10)}
              onChange={(event) => setUntil(event.target.value)}
              onKeyDown={(event) => event.stopPropagation()}
              className="border-b border-edge bg-field px-1.5 font-num"
            />
          </label>
        </div>
      </div>
    </Popover>
  );
}
