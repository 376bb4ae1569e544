"use client";
import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { useDisplay } from "@/components/display/display-provider";
import { Quantity, UnitOf } from "@/components/display/quantity";
import { FAMILY_NAME } from "@/components/rack/family-names";
import { RANGE, RANGE_NAMES } from "@/components/rack/ranges";
import { rangeWords } from "@/components/rack/range-field";
import { CLEARED, queryOf, type RackSearch, type SearchChange } from "@/components/rack/search-params";
import { Button } from "@/components/ui/button";
import { EmptyBay } from "@/components/ui/empty-bay";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { FinderPage, RangeName } from "@/lib/schemas/find-shapes";

type NothingFoundProps = Readonly<{
  search: RackSearch;
  onChange: (change: SearchChange) => void;
}>;

/** Nothing fits: the ask in words, and for each range that is set what comes back when that one is let go. */
export function NothingFound({ search, onChange }: NothingFoundProps) {
  const { settings } = useDisplay();
  const set = RANGE_NAMES.filter((name) => search[name] !== null);
  const others = [
    ...(search.q ? [`text “${search.q}”`] : []),
    ...(search.job ? [`job ${search.job}`] : []),
    ...(search.tag ? [`tag ${search.tag}`] : []),
    ...(search.family ?? []).map((f) => FAMILY_NAME[f].toLowerCase()),
    ...(search.state ?? []),
  ];
  return (
    <EmptyBay
      head="Nothing on the Rack meets all of this."
      actions={
        <>
          {set.map((name) => (
            <Loosen key={name} name={name} search={search} onChange={onChange} />
          ))}
          {search.bay && search.bay.length > 0 && (
            <Button size="small" onClick={() => onChange({ bay: null })}>
              Look in all bays
            </Button>
          )}
          {search.q && (
            <Button size="small" onClick={() => onChange({ q: null })}>
              Let the text go
            </Button>
          )}
          {search.family && (
            <Button size="small" onClick={() => onChange({ family: null })}>
              Any family
            </Button>
          )}
          <Button size="small" kind="plain" onClick={() => onChange(CLEARED)}>
            Clear the filter
          </Button>
        </>
      }
    >
      <p>
        Asked for:{" "}
        {set.map((name, i) => {
          const facts = RANGE[name];
          const which = "property" in facts ? { property: facts.property } : { dimension: facts.dimension };
          return (
            <span key={name}>
              {i > 0 && ", "}
              {rangeWords(name, settings.notation)} <Quantity {...which} value={search[name]} />{" "}
              <UnitOf {...which} className="text-note" />
            </span>
          );
        })}
        {others.length > 0 && `${set.length > 0 ? ", " : ""}${others.join(", ")}`}.
      </p>
    </EmptyBay>
  );
}

/** What the search would find without one of its ranges: the nearest shape by that range, and a press that lets it in. */
function Loosen({ name, search, onChange }: NothingFoundProps & { name: RangeName }) {
  const facts = RANGE[name];
  const column = "property" in facts ? facts.property : facts.name;
  const query = {
    ...queryOf({ ...search, [name]: null, sort: facts.end === "min" ? `-${column}` : column }),
    limit: 1,
  };
  const nearest = useQuery({
    queryKey: [...queryKeys.shapes(query), "nearest"],
    queryFn: async ({ signal }) =>
      (await api.get<FinderPage>("/shapes", { query, signal })).data.items[0] ?? null,
  });
  const row = nearest.data;
  if (!row) return null;
  const found = row[column as keyof typeof row];
  if (typeof found !== "number") return null;
  const which = "property" in facts ? { property: facts.property } : { dimension: facts.dimension };
  return (
    <span className="inline-flex items-center gap-2">
      <Button size="small" onClick={() => onChange({ [name]: found })}>
        Let {"property" in facts ? rangeWords(name, "S-Z-r") : `${facts.end} ${facts.name}`} go to{" "}
        <Quantity {...which} value={found} />
      </Button>
      <span className="text-table text-ink-2">
        nearest:{" "}
        <Link className="link" href={`/rack/${row.id}`} prefetch={false}>
          {row.designation}
        </Link>
      </span>
    </span>
  );
}
