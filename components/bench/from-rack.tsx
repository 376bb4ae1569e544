"use client";
import { keepPreviousData, useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { RackIcon } from "@/components/bench/tool-icons";
import { toolClass } from "@/components/bench/tool-class";
import { useFromRack } from "@/components/bench/use-from-rack";
import { Quantity, UnitOf } from "@/components/display/quantity";
import { useShortcut } from "@/components/sheet/use-shortcut";
import { TextField } from "@/components/ui/field";
import { Popover } from "@/components/ui/popover";
import { RefusedSign } from "@/components/ui/signs";
import { api, sentenceOf } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { FinderPage } from "@/lib/schemas/find-shapes";

const ROWS = 8;

/** Finds a released shape by its designation and sets it on the sheet with the revision it came from. */
export const FromRack = () => {
  const [open, setOpen] = useState(false);
  useShortcut("r", (event) => {
    event.preventDefault();
    setOpen(true);
  });
  return (
    <Popover
      label="From the Rack"
      open={open}
      onOpenChange={setOpen}
      trigger={
        <button type="button" className={toolClass(open)} aria-keyshortcuts="R">
          <RackIcon />
          From Rack
          <kbd aria-hidden className="font-num text-note text-ink-3 max-xl:hidden">
            R
          </kbd>
        </button>
      }
    >
      <RackFinder onPlaced={() => setOpen(false)} />
    </Popover>
  );
};

const RackFinder = ({ onPlaced }: { onPlaced: () => void }) => {
  const { place } = useFromRack();
  const [text, setText] = useState("");
  const [refused, setRefused] = useState<string | null>(null);
  const query = { q: text.trim(), limit: ROWS };
  const found = useQuery({
    queryKey: queryKeys.shapes(query),
    queryFn: async ({ signal }) => (await api.get<FinderPage>("/shapes", { query, signal })).data,
    placeholderData: keepPreviousData,
  });
  const choose = async (id: string) => {
    const placed = await place(id);
    if (placed.ok) onPlaced();
    else setRefused(placed.error.detail);
  };
  const rows = found.data?.items ?? [];
  return (
    <div className="w-80">
      <TextField
        label="Designation or title"
        autoFocus
        autoComplete="off"
        value={text}
        onChange={(event) => setText(event.target.value)}
        onKeyDown={(event) => {
          if (event.key === "Enter" && rows[0]) void choose(rows[0].id);
        }}
        error={refused ?? (found.isError ? sentenceOf(found.error) : null)}
      />
      <ul className="mt-2 border-t border-rule" aria-label="Released shapes">
        {rows.map((row) => (
          <li key={row.id} className="border-b border-rule">
            <button
              type="button"
              className="flex h-8 w-full items-center gap-3 px-1.5 text-left hover:bg-wash max-md:h-11"
              onClick={() => void choose(row.id)}
            >
              <b className="font-num text-table">{row.designation}</b>
              <span className="flex-1 truncate text-note text-ink-2">{row.title}</span>
              <span className="text-note">
                <Quantity property="mass" value={row.mass} /> <UnitOf property="mass" />
              </span>
            </button>
          </li>
        ))}
      </ul>
      {found.isSuccess && rows.length === 0 && (
        <p className="mt-2 flex gap-1.5 text-note text-ink-2">
          <RefusedSign label={null} className="mt-px" /> No released shape matches.
        </p>
      )}
    </div>
  );
};
