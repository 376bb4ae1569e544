"use client";
import dynamic from "next/dynamic";
import { useState, type ComponentProps } from "react";
import type { FilterBarProps } from "@/components/rack/filter-bar";
import { MORE_RANGES } from "@/components/rack/ranges";
import type { RackSearch } from "@/components/rack/search-params";
import { Button } from "@/components/ui/button";

/** The rest of the filter, fetched at the first press; the trigger says how much of it is set. */
export function MoreFilters(props: FilterBarProps) {
  const [wanted, setWanted] = useState(false);
  if (!wanted)
    return <MoreButton search={props.search} aria-haspopup="dialog" onClick={() => setWanted(true)} />;
  return <MoreFiltersPopover {...props} />;
}

const MoreFiltersPopover = dynamic(() => import("@/components/rack/more-filters-popover"), { ssr: false });

export function MoreButton({ search, ...rest }: ComponentProps<"button"> & { search: RackSearch }) {
  const set = MORE_RANGES.filter((name) => search[name] !== null).length + (search.tag ? 1 : 0);
  return (
    <Button size="small" kind={set > 0 ? "danger" : "plain"} {...rest}>
      {set > 0 ? `More, ${set} set` : "More"}
    </Button>
  );
}
