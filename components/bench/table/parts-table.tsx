"use client";
import { useMemo, type KeyboardEvent } from "react";
import { useBench } from "@/components/bench/bench-store";
import { AddRow } from "@/components/bench/table/add-row";
import { PartRow } from "@/components/bench/table/part-row";
import { Quantity, UnitOf } from "@/components/display/quantity";
import { useMedia } from "@/components/sheet/use-media";
import { cx } from "@/components/ui/cx";
import type { Slenderness } from "@/lib/drawing/slenderness";

const HEAD =
  "h-[34px] border-b border-frame bg-panel px-2 pb-[3px] align-bottom font-medium whitespace-nowrap text-ink-2";

const Head = ({
  children,
  unit,
  numeric,
  className,
}: {
  children?: React.ReactNode;
  unit?: React.ReactNode;
  numeric?: boolean;
  className?: string;
}) => (
  <th scope="col" className={cx(HEAD, numeric ? "text-right" : "text-left", className)}>
    {children}
    {unit && <span className="block text-micro leading-[13px] font-regular text-ink-3">{unit}</span>}
  </th>
);

/** Up, Down and Enter go to the same column of the next row, as in a sheet of figures. */
const walk = (event: KeyboardEvent<HTMLTableElement>): void => {
  const step = { ArrowDown: 1, ArrowUp: -1, Enter: 1 }[event.key];
  const from = event.target;
  if (!step || !(from instanceof HTMLInputElement) || from.dataset.addRow !== undefined) return;
  const rows = [...event.currentTarget.querySelectorAll<HTMLTableRowElement>("tbody tr")];
  const row = from.closest("tr");
  const cell = from.closest("td");
  if (!row || !cell) return;
  const next = rows[rows.indexOf(row) + step]?.cells[cell.cellIndex];
  const target =
    next?.querySelector("input") ??
    (step === 1 ? event.currentTarget.querySelector<HTMLInputElement>("[data-add-row]") : null);
  if (!target || from.getAttribute("aria-invalid") === "true") return;
  event.preventDefault();
  target.focus();
};

/** The canvas' equal: every part, every number to be typed, all by keyboard. */
export const PartsTable = () => {
  const drawing = useBench((s) => s.history.now);
  const picked = useBench((s) => s.picked);
  const figures = useBench((s) => s.figures);
  const stale = useBench((s) => s.figuresOf !== s.history.now);
  const least = useMemo(() => {
    const worst = new Map<string, Slenderness>();
    for (const s of figures?.slenderness ?? []) {
      const known = worst.get(s.part);
      if (!known || s.ratio > known.ratio) worst.set(s.part, s);
    }
    return worst;
  }, [figures]);
  const wide = useMedia("(min-width: 820px)");
  const has = drawing.parts.length > 0;
  return (
    <table
      className={cx("w-full border-collapse text-table", stale && "[&_.computed]:text-ink-3")}
      onKeyDown={walk}
      aria-label="Parts"
    >
      <thead>
        <tr>
          <Head className="w-9">
            <span className="sr-only">Item</span>
          </Head>
          <Head className="min-w-28">Part</Head>
          <Head className="max-md:hidden">From</Head>
          <Head numeric unit={<UnitOf dimension="length" />} className="w-[76px]">
            Width
          </Head>
          <Head numeric unit={<UnitOf dimension="length" />} className="w-[76px]">
            Height
          </Head>
          <Head numeric unit={<UnitOf dimension="length" />} className="w-[80px]">
            x, centre
          </Head>
          <Head numeric unit={<UnitOf dimension="length" />} className="w-[80px]">
            y, centre
          </Head>
          <Head numeric unit="deg" className="w-[60px] max-md:hidden">
            Rotation
          </Head>
          <Head className="w-[112px] max-md:hidden">Grade</Head>
          <Head numeric unit={<UnitOf dimension="area" />}>
            A
          </Head>
          <Head numeric unit={<UnitOf dimension="linearMass" />}>
            Mass
          </Head>
          <Head numeric unit="face to free edge" className="max-lg:hidden">
            b/t
          </Head>
          <Head className="w-8">
            <span className="sr-only">More</span>
          </Head>
        </tr>
      </thead>
      <tbody>
        {drawing.parts.map((part, i) => (
          <PartRow
            key={part.id}
            part={part}
            item={i + 1}
            inHand={picked.includes(part.id)}
            materials={drawing.materials}
            area={figures?.parts[part.id]?.area}
            mass={figures?.parts[part.id]?.mass}
            slendernessRatio={least.get(part.id)?.ratio}
            slendernessKind={least.get(part.id)?.kind}
          />
        ))}
      </tbody>
      <tfoot>
        <tr>
          <td className="h-7 max-md:h-11" />
          <td colSpan={has ? (wide ? 8 : 5) : 12} className="px-2">
            <AddRow first={!has} />
          </td>
          <td className={cx("px-2 text-right font-[640]", stale && "text-ink-3", !has && "hidden")}>
            {has && <Quantity dimension="area" value={totalOf(figures?.parts, "area")} />}
          </td>
          <td className={cx("px-2 text-right font-[640]", stale && "text-ink-3", !has && "hidden")}>
            {has && <Quantity dimension="linearMass" value={figures?.properties.mass} />}
          </td>
          {has && (
            <>
              <td className="max-lg:hidden" />
              <td />
            </>
          )}
        </tr>
      </tfoot>
    </table>
  );
};

const totalOf = (
  parts: Readonly<Record<string, Readonly<{ area: number; mass: number }>>> | undefined,
  key: "area" | "mass",
): number | null => (parts ? Object.values(parts).reduce((sum, p) => sum + p[key], 0) : null);
