"use client";
import dynamic from "next/dynamic";
import { useState } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { Count, Quantity } from "@/components/display/quantity";
import type { FilterBarProps } from "@/components/rack/filter-bar";
import { FAMILY_NAME } from "@/components/rack/family-names";
import { RANGE, RANGE_NAMES } from "@/components/rack/ranges";
import { rangeWords } from "@/components/rack/range-field";
import { Button } from "@/components/ui/button";

const PhoneFilterDialog = dynamic(() => import("@/components/rack/phone-filter-dialog"), { ssr: false });

/** What the filter asks in one line; the filter itself opens as a full sheet. */
export function PhoneFilter({ search, counts, onChange }: FilterBarProps) {
  const { settings } = useDisplay();
  const [open, setOpen] = useState(false);
  const set = RANGE_NAMES.filter((name) => search[name] !== null);
  return (
    <div className="flex flex-none items-stretch border-b border-frame">
      <div className="min-w-0 flex-1 px-3.5 py-1.5">
        <p>
          {counts ? (
            <>
              <b className="text-[17px]">
                <Count value={counts.total} />
              </b>{" "}
              fit, of <Count value={counts.of} />
            </>
          ) : (
            "counting"
          )}
        </p>
        <p className="truncate text-ink-2">
          {set.map((name) => {
            const facts = RANGE[name];
            const which = "property" in facts ? { property: facts.property } : { dimension: facts.dimension };
            return (
              <span key={name}>
                {rangeWords(name, settings.notation)} <Quantity {...which} value={search[name]} />,{" "}
              </span>
            );
          })}
          {search.q && `“${search.q}”, `}
          {search.family?.map((f) => `${FAMILY_NAME[f].toLowerCase()}, `)}
          {search.state?.join(", ") ?? "released"}
        </p>
      </div>
      <Button kind="plain" className="h-auto border-l border-rule px-4" onClick={() => setOpen(true)}>
        Filter
      </Button>
      {open && (
        <PhoneFilterDialog
          search={search}
          counts={counts}
          onChange={onChange}
          onClose={() => setOpen(false)}
        />
      )}
    </div>
  );
}
