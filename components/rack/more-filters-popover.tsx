"use client";
import { Popover } from "@/components/ui/popover";
import type { FilterBarProps } from "@/components/rack/filter-bar";
import { MoreButton } from "@/components/rack/more-filters";
import { FAMILIES, FAMILY_NAME } from "@/components/rack/family-names";
import { MORE_RANGES } from "@/components/rack/ranges";
import { RangeField } from "@/components/rack/range-field";
import { TextFilter } from "@/components/rack/text-filter";
import { Checkbox } from "@/components/ui/choice";

/** Every other range, text, and several families at once. */
export default function MoreFiltersPopover({ search, counts, onChange }: FilterBarProps) {
  const families = search.family ?? [];
  return (
    <Popover
      label="More of the filter"
      align="end"
      defaultOpen
      className="w-[620px]"
      trigger={<MoreButton search={search} />}
    >
      <div className="grid grid-cols-3 gap-x-4 gap-y-2 max-md:grid-cols-2">
        {MORE_RANGES.map((name) => (
          <RangeField
            key={name}
            name={name}
            value={search[name]}
            onCommit={(value) => onChange({ [name]: value })}
          />
        ))}
        <TextFilter
          label="Designation or title"
          value={search.q}
          onCommit={(q) => onChange({ q })}
          placeholder="any"
        />
        <TextFilter label="Job" value={search.job} onCommit={(job) => onChange({ job })} placeholder="any" />
        <TextFilter label="Tag" value={search.tag} onCommit={(tag) => onChange({ tag })} placeholder="any" />
      </div>
      <fieldset className="mt-3 border-t border-rule pt-2">
        <legend className="text-micro text-ink-2">Families</legend>
        <div className="grid grid-cols-3 gap-x-4 max-md:grid-cols-2">
          {FAMILIES.filter((f) => families.includes(f) || !counts || (counts.byFamily[f] ?? 0) > 0).map(
            (f) => (
              <Checkbox
                key={f}
                label={FAMILY_NAME[f]}
                checked={families.includes(f)}
                onChange={(on) => {
                  const next = on ? [...families, f] : families.filter((other) => other !== f);
                  onChange({ family: next.length > 0 ? next : null });
                }}
              />
            ),
          )}
        </div>
      </fieldset>
    </Popover>
  );
}
