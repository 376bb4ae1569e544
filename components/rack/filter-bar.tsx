"use client";
import { useId, type ReactNode } from "react";
import { Count } from "@/components/display/quantity";
import { FAMILIES, FAMILY_NAME } from "@/components/rack/family-names";
import { MoreFilters } from "@/components/rack/more-filters";
import { BAR_RANGES } from "@/components/rack/ranges";
import { RangeField } from "@/components/rack/range-field";
import { SavedSearches } from "@/components/rack/saved-searches";
import {
  CLEARED,
  isNarrowed,
  loadRackState,
  searchOf,
  type RackSearch,
  type SearchChange,
} from "@/components/rack/search-params";
import { TextFilter } from "@/components/rack/text-filter";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { Select } from "@/components/ui/select";
import type { FinderCounts } from "@/lib/schemas/find-shapes";
import type { ShapeFamily } from "@/lib/schemas/shape";

export type FilterBarProps = Readonly<{
  search: RackSearch;
  counts: FinderCounts | null;
  onChange: (change: SearchChange) => void;
}>;

type StateChoice = "released" | "submitted" | "draft" | "withdrawn" | "all";
const STATES: readonly Readonly<{ value: StateChoice; label: string }>[] = [
  { value: "released", label: "released" },
  { value: "submitted", label: "submitted" },
  { value: "draft", label: "draft" },
  { value: "withdrawn", label: "withdrawn" },
  { value: "all", label: "any state" },
];
const stateOf = (states: RackSearch["state"]): StateChoice =>
  !states || states.length === 0 ? "released" : states.length > 1 ? "all" : (states[0] ?? "released");

/** The filter: what is set has a heavy rule; the number that fits stands beside it. */
export function FilterBar({ search, counts, onChange }: FilterBarProps) {
  const family: ShapeFamily | "" = search.family?.length === 1 ? (search.family[0] ?? "") : "";
  const state = stateOf(search.state);
  return (
    <form
      aria-label="Filter"
      onSubmit={(event) => event.preventDefault()}
      className="no-print flex min-w-0 flex-wrap items-stretch border-b border-frame"
    >
      {BAR_RANGES.map((name) => (
        <FilterCell key={name}>
          <RangeField name={name} value={search[name]} onCommit={(value) => onChange({ [name]: value })} />
        </FilterCell>
      ))}
      <FilterCell>
        <LabelledSelect
          label="Family"
          set={family !== ""}
          value={family}
          choices={[
            {
              value: "",
              label: search.family && search.family.length > 1 ? `${search.family.length} families` : "any",
            },
            ...FAMILIES.filter((f) => !counts || f === family || (counts.byFamily[f] ?? 0) > 0).map((f) => ({
              value: f,
              label: counts ? `${FAMILY_NAME[f]} (${counts.byFamily[f] ?? 0})` : FAMILY_NAME[f],
            })),
          ]}
          onChange={(next) => onChange({ family: next === "" ? null : [next] })}
        />
      </FilterCell>
      <FilterCell>
        <LabelledSelect
          label="State"
          set={state !== "released"}
          value={state}
          choices={STATES}
          onChange={(next) =>
            onChange({
              state:
                next === "released"
                  ? null
                  : next === "all"
                    ? ["draft", "submitted", "released", "withdrawn"]
                    : [next],
            })
          }
        />
      </FilterCell>
      <FilterCell className="max-xl:hidden">
        <TextFilter label="Job" value={search.job} onCommit={(job) => onChange({ job })} placeholder="any" />
      </FilterCell>
      {search.q !== null && (
        <FilterCell>
          <TextFilter label="Text" value={search.q} onCommit={(q) => onChange({ q })} placeholder="any" />
        </FilterCell>
      )}
      <output aria-live="polite" className="self-center px-4 whitespace-nowrap">
        {counts ? (
          <>
            <b className="text-title leading-6">
              <Count value={counts.total} className="font-[640]" />
            </b>
            {" fit, of "}
            <Count value={counts.of} className="text-table" />
          </>
        ) : (
          <span className="text-ink-3">counting</span>
        )}
      </output>
      <span className="flex-1" />
      <span className="flex flex-wrap items-center gap-2 py-1.5 pr-2">
        <MoreFilters search={search} counts={counts} onChange={onChange} />
        {isNarrowed(search) && (
          <Button size="small" kind="plain" onClick={() => onChange(CLEARED)}>
            Clear
          </Button>
        )}
        <SavedSearches
          search={search}
          onOpen={(query) => onChange({ ...CLEARED, ...searchOf(loadRackState(query)) })}
        />
      </span>
    </form>
  );
}

const FilterCell = ({ className, children }: { className?: string; children: ReactNode }) => (
  <div className={cx("border-r border-rule px-3 pt-[5px] pb-1.5 max-md:flex-1 max-md:border-b", className)}>
    {children}
  </div>
);

type LabelledSelectProps<V extends string> = Readonly<{
  label: string;
  value: V;
  set: boolean;
  choices: readonly Readonly<{ value: V; label: string }>[];
  onChange: (value: V) => void;
}>;

function LabelledSelect<V extends string>({ label, ...rest }: LabelledSelectProps<V>) {
  const id = useId();
  return (
    <>
      <label
        htmlFor={id}
        className={cx("mb-0.5 block text-micro", rest.set ? "font-[600] text-ink" : "text-ink-2")}
      >
        {label}
      </label>
      <Select id={id} aria-label={label} {...rest} className="h-6 w-[124px]" />
    </>
  );
}
