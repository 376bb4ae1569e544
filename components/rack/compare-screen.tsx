"use client";
import dynamic from "next/dynamic";
import Link from "next/link";
import { useRouter } from "next/navigation";
import { useEffect, useRef, useState } from "react";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { Signed } from "@/components/rack/both-figures";
import { FAMILY_NAME } from "@/components/rack/family-names";
import { NOT_CHECKED } from "@/components/rack/not-checked";
import { countingValue, percentChange } from "@/components/rack/property-value";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { Sheet } from "@/components/sheet/sheet";
import { Button, buttonClass } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { EmptyBay } from "@/components/ui/empty-bay";
import { RevisionMark, StateChip } from "@/components/ui/marks";
import { Notice } from "@/components/ui/notice";
import { UnsymmetricalSign } from "@/components/ui/signs";
import { Table, Td, Th } from "@/components/ui/table";
import type { FigureShow } from "@/lib/figure/compose-figure";
import type { ShapeSheet } from "@/lib/schemas/shape";
import { PROPERTY_NAME } from "@/lib/units/property-names";
import type { PropertyKey } from "@/lib/units/property-units";

const ShapeFigure = dynamic(() => import("@/components/rack/shape-figure"), { ssr: false });
const SHOW: FigureShow = { dimensions: false, axes: true, balloons: false, centroidDimension: false };

const KEYS: readonly PropertyKey[] = [
  "mass",
  "area",
  "surface",
  "Ix",
  "SxTop",
  "SxBottom",
  "Zx",
  "rx",
  "Iy",
  "Sy",
  "Zy",
  "ry",
  "J",
  "Cw",
  "Avy",
  "Mp.x",
];
const HEIGHT_PX = 280;
const MARGIN_PX = 44;

type CompareScreenProps = Readonly<{ sheets: readonly ShapeSheet[]; missing: number }>;

/** Up to six shapes side by side, drawn to one scale; each figure as it counts in its bay, and its share of the first. */
export function CompareScreen({ sheets, missing }: CompareScreenProps) {
  const router = useRouter();
  const frame = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState(220);
  useEffect(() => {
    const box = frame.current;
    if (!box) return;
    const observer = new ResizeObserver(([entry]) => {
      const all = entry?.contentRect.width ?? 0;
      setWidth(Math.max(120, Math.floor((all - 190) / Math.max(sheets.length, 1))));
    });
    observer.observe(box);
    return () => observer.disconnect();
  }, [sheets.length]);
  const sizes = sheets.map(({ revision: { computed } }) => ({
    width: computed.extents.xMax - computed.extents.xMin,
    height: computed.extents.yMax - computed.extents.yMin,
  }));
  const pxPerMm = Math.min(
    ...sizes.map((s) => Math.min((width - MARGIN_PX) / s.width, (HEIGHT_PX - MARGIN_PX) / s.height)),
  );
  const without = (id: string) => {
    const rest = sheets.filter((sheet) => sheet.id !== id).map((sheet) => sheet.id);
    router.replace(rest.length > 0 ? `/rack/compare?with=${rest.join(",")}` : "/rack/compare");
  };
  const first = sheets[0];
  return (
    <Sheet
      heading="Shapes side by side"
      className="flex flex-col"
      block={
        <TitleBlock>
          <Cell label="Sheet" big>
            Side by side
          </Cell>
          <Cell label="Shapes" fill stays="md">
            {sheets.map((sheet) => sheet.designation).join(", ")}
          </Cell>
          <Cell label="Scale" stays="md">
            one for all
          </Cell>
          <ActionCell>
            <Button kind="plain" className="px-[18px]" onClick={() => window.print()}>
              Print
            </Button>
            <Link href="/rack" className={`${buttonClass({ kind: "main" })} px-[18px]`}>
              Back to the Rack
            </Link>
          </ActionCell>
        </TitleBlock>
      }
    >
      {missing > 0 && (
        <Notice kind="word" head={`${missing} of the shapes asked for cannot be shown.`} className="m-3">
          They do not exist, or they are not released to you.
        </Notice>
      )}
      {first === undefined ? (
        <EmptyBay
          head="Nothing is chosen to compare."
          actions={
            <Link href="/rack" className={buttonClass({ kind: "main" })}>
              Choose on the Rack
            </Link>
          }
        >
          <p>On the Rack, take a shape in hand and press C; up to six stand here side by side.</p>
        </EmptyBay>
      ) : (
        <div ref={frame} className="relative min-w-0 overflow-x-auto">
          <Table className="table-fixed" style={{ minWidth: 190 + sheets.length * 130 }}>
            <colgroup>
              <col className="w-[190px]" />
              {sheets.map((sheet) => (
                <col key={sheet.id} />
              ))}
            </colgroup>
            <thead>
              <tr>
                <Th className="pl-3 align-bottom" unit={<>per cent against {first.designation}</>}>
                  Property
                </Th>
                {sheets.map((sheet, i) => (
                  <th
                    key={sheet.id}
                    scope="col"
                    className="border-b border-l border-frame px-2 pt-2 pb-1 text-left align-bottom font-regular"
                  >
                    <span className="flex items-end justify-center" style={{ height: HEIGHT_PX }}>
                      <ShapeFigure
                        drawing={sheet.revision.drawing}
                        properties={sheet.revision.computed}
                        label={`Section of ${sheet.designation}`}
                        fit={{ pxPerMm: Number.isFinite(pxPerMm) ? pxPerMm : 0.2 }}
                        show={SHOW}
                        className="max-w-full"
                      />
                    </span>
                    <span className="flex flex-wrap items-center gap-1.5">
                      <Link href={`/rack/${sheet.id}`} className="link font-bold">
                        {sheet.designation}
                      </Link>
                      <RevisionMark letter={sheet.revision.letter} />
                      {sheet.revision.state !== "released" && <StateChip state={sheet.revision.state} />}
                      {sheet.revision.computed.unsymmetrical && <UnsymmetricalSign />}
                    </span>
                    <span className="flex justify-between text-note text-ink-3">
                      {FAMILY_NAME[sheet.family]}
                      <button
                        type="button"
                        className="no-print link min-h-6"
                        aria-label={`Put ${sheet.designation} back`}
                        onClick={() => without(sheet.id)}
                      >
                        put back
                      </button>
                    </span>
                    {i === 0 && <span className="sr-only">the others are measured against this one</span>}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {KEYS.map((key) => (
                <CompareRow key={key} property={key} sheets={sheets} />
              ))}
            </tbody>
          </Table>
          <p className="px-3 py-2 text-note text-ink-2">Not checked: {NOT_CHECKED}</p>
        </div>
      )}
    </Sheet>
  );
}

const valueIn = (sheet: ShapeSheet, key: PropertyKey): number | null =>
  countingValue(
    { computed: sheet.revision.computed, tabulated: sheet.revision.tabulated, counts: sheet.counts },
    key,
  ).value;

function CompareRow({ property, sheets }: { property: PropertyKey; sheets: readonly ShapeSheet[] }) {
  const values = sheets.map((sheet) => valueIn(sheet, property));
  return (
    <tr>
      <th
        scope="row"
        className="truncate border-b border-rule pl-3 text-left font-regular text-ink-2"
        title={PROPERTY_NAME[property]}
      >
        <SymbolOf property={property} className="text-ink" />{" "}
        <UnitOf property={property} className="text-note" />
        <span className="sr-only">{PROPERTY_NAME[property]}</span>
      </th>
      {values.map((value, i) => {
        const change = i === 0 ? null : percentChange(values[0] ?? null, value);
        return (
          <Td key={sheets[i]?.id} numeric className={cx("border-l border-l-rule", i === 0 && "bg-panel")}>
            <Quantity
              property={property}
              value={value}
              absent={<span className="text-note text-ink-3">not computed</span>}
            />
            <span className="ml-2 inline-block w-14 text-note text-ink-3">
              {change !== null && <Signed percent={change} />}
            </span>
          </Td>
        );
      })}
    </tr>
  );
}
