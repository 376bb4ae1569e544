"use client";
import dynamic from "next/dynamic";
import Link from "next/link";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { UnsymmetricalFactor } from "@/components/rack/shape-columns";
import { TransformedMark } from "@/components/rack/transformed-mark";
import { UsedIn } from "@/components/rack/used-in";
import { Button, buttonClass } from "@/components/ui/button";
import { Kbd, RevisionMark, StateChip } from "@/components/ui/marks";
import { Notice } from "@/components/ui/notice";
import { PaneHead } from "@/components/ui/table";
import { AwaitedLine } from "@/components/ui/waiting";
import { sentenceOf } from "@/lib/client/api";
import { useShapeSheet } from "@/lib/client/shapes";
import type { FigureShow } from "@/lib/figure/compose-figure";
import type { Bay } from "@/lib/schemas/bay";
import type { FinderRow } from "@/lib/schemas/find-shapes";
import { PROPERTY_NAME } from "@/lib/units/property-names";
import type { PropertyKey } from "@/lib/units/property-units";

// The figure brings geometry and the clipper with it: late, so that the list stands first.
const ShapeFigure = dynamic(() => import("@/components/rack/shape-figure"), { ssr: false });

const FIT = { width: 360, height: 298 };
const SHOW: FigureShow = { dimensions: true, axes: true, balloons: false, centroidDimension: true };

type PreviewProps = Readonly<{
  row: FinderRow;
  bay: Bay | undefined;
  compared: boolean;
  canCompare: boolean;
  onCompare: () => void;
}>;

/** The shape in hand: figure, the figures that decide, where it is used, and what can be done with it. */
export function PreviewPane({ row, bay, compared, canCompare, onCompare }: PreviewProps) {
  const sheet = useShapeSheet(row.id, row.ordinal);
  const revision = sheet.data?.sheet.revision;
  const properties = revision?.computed ?? null;
  return (
    <aside
      aria-label={`Preview of ${row.designation}`}
      className="flex min-h-0 flex-col border-l border-frame max-lg:hidden"
    >
      <PaneHead className="bg-sheet">
        <span className="truncate">{row.designation}</span>
        <RevisionMark letter={row.letter} />
        <StateChip state={row.state} />
        <UnsymmetricalFactor row={row} />
        <TransformedMark drawing={row.drawing} />
        <span className="flex-1" />
        {bay && (
          <span className="text-note font-regular text-ink-3" title={bay.name}>
            Bay {bay.ordinal}
          </span>
        )}
      </PaneHead>
      <div className="min-h-0 flex-1 overflow-y-auto">
        <div className="flex h-[300px] items-center justify-center border-b border-rule">
          {revision ? (
            <ShapeFigure
              drawing={revision.drawing}
              properties={properties}
              fit={FIT}
              label={`Section of ${row.designation}`}
              show={SHOW}
            />
          ) : sheet.isError ? (
            <Notice kind="lost" head="The sheet could not be fetched." className="m-4">
              {sentenceOf(sheet.error)}
            </Notice>
          ) : (
            <AwaitedLine>fetching the sheet</AwaitedLine>
          )}
        </div>
        <dl className="text-table">
          <PreviewRow property="area" value={row.area} />
          <PreviewRow property="Ix" value={row.Ix} strong />
          {properties && properties.SxTop !== properties.SxBottom ? (
            <>
              <PreviewRow property="SxTop" value={properties.SxTop} strong />
              <PreviewRow property="SxBottom" value={properties.SxBottom} strong />
            </>
          ) : (
            <PreviewRow property="Sx" value={row.Sx} strong />
          )}
          <PreviewRow property="Zx" value={row.Zx} strong />
          <PreviewRow property="Iy" value={row.Iy} />
          <PreviewRow property="rx" value={row.rx} />
          <PreviewRow property="ry" value={row.ry} />
          <PreviewRow property="J" value={row.J} />
          <PreviewRow property="Cw" value={row.Cw} />
        </dl>
        {row.unsymmetrical && (
          <p className="border-b border-rule px-3 py-1.5 text-note text-ink-2">
            x and y are not principal axes. For free bending under M<sub>x</sub> alone count with{" "}
            <SymbolOf property="Sx" /> = <Quantity property="Sx" value={row.unsymmetrical.SxFree} />{" "}
            <UnitOf property="Sx" />.
          </p>
        )}
        <UsedIn shapeId={row.id} letter={row.letter} />
      </div>
      <div className="flex flex-none gap-1.5 border-t border-rule px-3 py-2 [&>*]:flex-1 [&>*]:px-1.5 [&>*]:text-table">
        <Link prefetch={false} href={`/rack/${row.id}`} className={buttonClass()}>
          Open sheet <Kbd>Enter</Kbd>
        </Link>
        <Link
          prefetch={false}
          href={`/bench?shape=${row.id}&revision=${row.ordinal}`}
          className={buttonClass()}
        >
          Copy to Bench <Kbd>B</Kbd>
        </Link>
        <Button onClick={onCompare} aria-pressed={compared} disabled={!compared && !canCompare}>
          {compared ? "Put back" : "Compare"} <Kbd>C</Kbd>
        </Button>
      </div>
    </aside>
  );
}

function PreviewRow({
  property,
  value,
  strong,
}: {
  property: PropertyKey;
  value: number | null;
  strong?: boolean;
}) {
  return (
    <div className="grid h-6 grid-cols-[minmax(0,1fr)_36px_88px_66px] items-center gap-1 border-b border-rule pl-3">
      <dt className="contents">
        <span className="truncate text-ink-2">{PROPERTY_NAME[property]}</span>
        <SymbolOf property={property} />
      </dt>
      <dd className="contents">
        <span className="text-right">
          <Quantity
            property={property}
            value={value}
            absent={<span className="text-note text-ink-3">not computed</span>}
            {...(strong && { className: "font-[640]" })}
          />
        </span>
        <UnitOf property={property} className="text-note" />
      </dd>
    </div>
  );
}
