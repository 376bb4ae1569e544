"use client";
import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { TransformedMark } from "@/components/rack/transformed-mark";
import { PaneHead, Table, Td, Th } from "@/components/ui/table";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { FinderPage, FinderRow } from "@/lib/schemas/find-shapes";

/** Shares of S within which a shape is a neighbour. */
const BELOW = 0.9;
const ABOVE = 1.25;

/** The lightest released shapes about as strong as this one: what could stand in for it. */
export function NearestOnRack({ shapeId, Sx }: { shapeId: string; Sx: number }) {
  const query = { minSx: Sx * BELOW, maxSx: Sx * ABOVE, sort: "mass", limit: 6, include: "drawing" };
  const found = useQuery({
    queryKey: queryKeys.shapes(query),
    queryFn: async ({ signal }) => (await api.get<FinderPage>("/shapes", { query, signal })).data.items,
  });
  const rows: readonly FinderRow[] = found.data?.filter((row) => row.id !== shapeId).slice(0, 4) ?? [];
  if (rows.length === 0) return null;
  return (
    <section aria-label="Nearest on the Rack" className="no-print">
      <PaneHead className="border-t border-frame">
        <span>
          Nearest on the Rack by <SymbolOf property="Sx" />
        </span>
      </PaneHead>
      <Table>
        <thead>
          <tr>
            <Th className="pl-3">Designation</Th>
            <Th numeric unit={<UnitOf property="mass" />}>
              Mass
            </Th>
            <Th numeric unit={<UnitOf dimension="length" />}>
              Depth
            </Th>
            <Th numeric unit={<UnitOf property="Sx" />}>
              <SymbolOf property="Sx" />
            </Th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id}>
              <Td className="pl-3">
                <Link className="link" href={`/rack/${row.id}`} prefetch={false}>
                  {row.designation}
                </Link>
                <TransformedMark drawing={row.drawing} />
              </Td>
              <Td numeric>
                <Quantity property="mass" value={row.mass} />
              </Td>
              <Td numeric>
                <Quantity dimension="length" value={row.depth} />
              </Td>
              <Td numeric>
                <Quantity property="Sx" value={row.Sx} />
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
