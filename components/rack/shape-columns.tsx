"use client";
import Link from "next/link";
import { createColumnHelper, tableFeatures } from "@tanstack/react-table";
import type { ReactNode } from "react";
import { Count, Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { FAMILY_NAME } from "@/components/rack/family-names";
import { OverMinimum } from "@/components/rack/over-minimum";
import { RowSilhouette } from "@/components/rack/silhouette";
import { TransformedMark } from "@/components/rack/transformed-mark";
import { RevisionMark } from "@/components/ui/marks";
import { UnsymmetricalSign } from "@/components/ui/signs";
import type { FinderRow, SortColumn } from "@/lib/schemas/find-shapes";
import type { PropertyKey } from "@/lib/units/property-units";

export const rackFeatures = tableFeatures({});
const column = createColumnHelper<typeof rackFeatures, FinderRow>();

/** What a cell needs beside its row. */
export type ColumnContext = Readonly<{
  pxPerMm: number;
  decimals: Readonly<Partial<Record<PropertyKey | "depth" | "width", number>>>;
  minSx: number | null;
}>;

/** How a column is headed, sorted by, and at which widths it folds away. */
export type ColumnFacts = Readonly<{
  head: ReactNode;
  unit?: ReactNode;
  sort?: SortColumn;
  numeric?: boolean;
  className?: string;
}>;

const FOLDS = { secondary: "max-xl:hidden", wide: "max-md:hidden" } as const;

export const COLUMN_FACTS: Record<string, ColumnFacts> = {
  silhouette: { head: <span className="sr-only">Outline</span>, className: "w-11 pr-1 pl-3" },
  designation: { head: "Designation", sort: "designation" },
  family: { head: "Family", sort: "family", className: FOLDS.secondary },
  revision: { head: "Rev", className: "px-0.5" },
  state: { head: "State", className: FOLDS.secondary },
  mass: { head: "Mass", unit: <UnitOf property="mass" />, sort: "mass", numeric: true },
  depth: { head: "Depth", unit: <UnitOf dimension="length" />, sort: "depth", numeric: true },
  width: {
    head: "Width",
    unit: <UnitOf dimension="length" />,
    sort: "width",
    numeric: true,
    className: FOLDS.wide,
  },
  area: property("area", FOLDS.secondary),
  Ix: property("Ix"),
  Sx: property("Sx"),
  over: {
    head: (
      <>
        Over min <SymbolOf property="Sx" />
      </>
    ),
    unit: "%",
    numeric: true,
  },
  Zx: property("Zx", FOLDS.wide),
  rx: property("rx", FOLDS.wide),
  ry: property("ry"),
  J: property("J", FOLDS.secondary),
  jobs: { head: "Jobs", sort: "jobs", numeric: true },
};

function property(key: PropertyKey & SortColumn, className?: string): ColumnFacts {
  return {
    head: <SymbolOf property={key} />,
    unit: <UnitOf property={key} />,
    sort: key,
    numeric: true,
    ...(className && { className }),
  };
}

const figure = (key: "mass" | "area" | "Ix" | "Sx" | "Zx" | "rx" | "ry" | "J", { decimals }: ColumnContext) =>
  column.accessor(key, {
    id: key,
    cell: ({ row }) => (
      <Quantity
        property={key}
        value={row.original[key]}
        {...(decimals[key] !== undefined && { decimals: decimals[key] })}
        {...(key === "mass" && { className: "font-[640]" })}
      />
    ),
  });

const size = (key: "depth" | "width", { decimals }: ColumnContext) =>
  column.accessor(key, {
    id: key,
    cell: ({ row }) => (
      <Quantity
        dimension="length"
        value={row.original[key]}
        {...(decimals[key] !== undefined && { decimals: decimals[key] })}
      />
    ),
  });

/** The columns of the Rack; without a minimum S there is no column for what lies over it. */
export const shapeColumns = (context: ColumnContext) =>
  column.columns([
    column.display({
      id: "silhouette",
      cell: ({ row }) => (
        <RowSilhouette drawing={row.original.drawing} pxPerMm={context.pxPerMm} width={30} height={28} />
      ),
    }),
    column.accessor("designation", {
      id: "designation",
      cell: ({ row }) => (
        <>
          <Link
            href={`/rack/${row.original.id}`}
            tabIndex={-1}
            prefetch={false}
            className="font-[640] no-underline"
          >
            {row.original.designation}
          </Link>
          {row.original.unsymmetrical && <UnsymmetricalFactor row={row.original} />}
          <TransformedMark drawing={row.original.drawing} />
        </>
      ),
    }),
    column.accessor("family", {
      id: "family",
      cell: ({ row }) => <span className="text-ink-2">{FAMILY_NAME[row.original.family]}</span>,
    }),
    column.accessor("letter", {
      id: "revision",
      cell: ({ row }) => <RevisionMark letter={row.original.letter} />,
    }),
    column.accessor("state", {
      id: "state",
      cell: ({ row }) => <span className="text-ink-2">{row.original.state}</span>,
    }),
    figure("mass", context),
    size("depth", context),
    size("width", context),
    figure("area", context),
    figure("Ix", context),
    figure("Sx", context),
    ...(context.minSx === null
      ? []
      : [
          column.display({
            id: "over",
            cell: ({ row }) => <OverMinimum row={row.original} minSx={context.minSx ?? 0} />,
          }),
        ]),
    figure("Zx", context),
    figure("rx", context),
    figure("ry", context),
    figure("J", context),
    column.accessor("jobs", { id: "jobs", cell: ({ row }) => <Count value={row.original.jobs} /> }),
  ]);

/** The sign of axes that are not principal, with the true factor of extreme stress over M/S. */
export const UnsymmetricalFactor = ({ row }: { row: FinderRow }) =>
  row.unsymmetrical && (
    <span
      className="ml-1 whitespace-nowrap"
      title="x and y are not principal axes: the true extreme stress is this many times M/S"
    >
      <UnsymmetricalSign />
      <span className="figure text-note"> x{row.unsymmetrical.factorX.toFixed(2)}</span>
    </span>
  );
