"use client";
import type { FilterBarProps } from "@/components/rack/filter-bar";
import { FAMILY_NAME } from "@/components/rack/family-names";
import { RANGE_NAMES } from "@/components/rack/ranges";
import { RangeField } from "@/components/rack/range-field";
import { CLEARED, FINDABLE_STATES, isNarrowed } from "@/components/rack/search-params";
import { TextFilter } from "@/components/rack/text-filter";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { SelectField } from "@/components/ui/select";
import type { ShapeFamily } from "@/lib/schemas/shape";

type PhoneFilterDialogProps = FilterBarProps & Readonly<{ onClose: () => void }>;

/** The whole filter as a sheet of its own, for a phone. */
export default function PhoneFilterDialog({ search, counts, onChange, onClose }: PhoneFilterDialogProps) {
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Filter"
      width="sheet"
      actions={
        <>
          <Button kind="main" onClick={onClose}>
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
        <TextFilter label="Job" value={search.job} onCommit={(job) => onChange({ job })} placeholder="any" />
      </div>
    </Dialog>
  );
}
