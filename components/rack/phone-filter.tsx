"use client";
import { useState } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { Count, Quantity } from "@/components/display/quantity";
import type { FilterBarProps } from "@/components/rack/filter-bar";
import { FAMILY_NAME } from "@/components/rack/family-names";
import { RANGE, RANGE_NAMES } from "@/components/rack/ranges";
import { RangeField, rangeWords } from "@/components/rack/range-field";
import { CLEARED, FINDABLE_STATES, isNarrowed } from "@/components/rack/search-params";
import { TextFilter } from "@/components/rack/text-filter";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { SelectField } from "@/components/ui/select";
import type { ShapeFamily } from "@/lib/schemas/shape";

/** What the filter asks in one line, and the filter itself as a full sheet. */
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
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title="Filter"
        width="sheet"
        actions={
          <>
            <Button kind="main" onClick={() => setOpen(false)}>
              Show {counts?.total ?? ""}
            </Button>
            {isNarrowed(search) && <Button onClick={() => onChange(CLEARED)}>Clear</Button>}
          </>
        }
      >
        <div className="grid grid-cols-2 gap-3">
          <TextFilter
            label="Designation or title"
            value={search.q}
            onCommit={(q) => onChange({ q })}
            placeholder="any"
            className="col-span-2"
          />
          {RANGE_NAMES.map((name) => (
            <RangeField
              key={name}
              name={name}
              value={search[name]}
              onCommit={(value) => onChange({ [name]: value })}
            />
          ))}
          <SelectField<ShapeFamily | "">
            label="Family"
            value={search.family?.[0] ?? ""}
            choices={[
              { value: "", label: "any" },
              ...Object.entries(FAMILY_NAME).map(([value, label]) => ({
                value: value as ShapeFamily,
                label,
              })),
            ]}
            onChange={(family) => onChange({ family: family === "" ? null : [family] })}
          />
          <SelectField
            label="State"
            value={search.state?.[0] ?? "released"}
            choices={FINDABLE_STATES.map((value) => ({ value, label: value }))}
            onChange={(state) => onChange({ state: state === "released" ? null : [state] })}
          />
          <TextFilter
            label="Job"
            value={search.job}
            onCommit={(job) => onChange({ job })}
            placeholder="any"
          />
        </div>
      </Dialog>
    </div>
  );
}
