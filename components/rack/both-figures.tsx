"use client";
import { Count, Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { percentChange, propertyValue, type Figures } from "@/components/rack/property-value";
import { PaneHead, Table, Td, Th } from "@/components/ui/table";
import { UNIT_OF, type PropertyKey } from "@/lib/units/property-units";

const KEYS = Object.keys(UNIT_OF) as PropertyKey[];
/** The same per cent that an inspection lets pass when a reading says nothing else. */
const SHOWN_IN_CHALK_PERCENT = 1;

/** Computed and tabulated side by side, where a revision has both, and which of them the bay counts. */
export function BothFigures({ figures, bay }: { figures: Figures; bay: string }) {
  const { tabulated, computed, counts } = figures;
  if (!tabulated) return null;
  return (
    <>
      <PaneHead className="border-t border-frame">
        Computed and tabulated{" "}
        <span className="truncate text-note font-regular text-ink-3">
          {bay} counts the {counts} figures
        </span>
      </PaneHead>
      <Table>
        <thead>
          <tr>
            <Th className="pl-3">Property</Th>
            <Th numeric sorted={undefined} className={counts === "computed" ? "font-[640] text-ink" : ""}>
              Computed
            </Th>
            <Th numeric className={counts === "tabulated" ? "font-[640] text-ink" : ""}>
              Tabulated
            </Th>
            <Th numeric unit="%">
              Off
            </Th>
            <Th>
              <span className="sr-only">Unit</span>
            </Th>
          </tr>
        </thead>
        <tbody>
          {KEYS.filter((key) => tabulated[key] !== undefined).map((key) => {
            const mine = propertyValue(computed, key);
            const theirs = tabulated[key] ?? null;
            const off = percentChange(mine, theirs);
            const far = off !== null && Math.abs(off) > SHOWN_IN_CHALK_PERCENT;
            return (
              <tr key={key} className={far ? "bg-chalk-wash" : undefined}>
                <Td className="pl-3">
                  <SymbolOf property={key} />
                </Td>
                <Td numeric>
                  <Quantity
                    property={key}
                    value={mine}
                    {...(counts === "computed" && { className: "font-[640]" })}
                  />
                </Td>
                <Td numeric>
                  <Quantity
                    property={key}
                    value={theirs}
                    {...(counts === "tabulated" && { className: "font-[640]" })}
                  />
                </Td>
                <Td numeric>{off === null ? "" : <Signed percent={off} decimals={2} />}</Td>
                <Td className="pl-0 text-note">
                  <UnitOf property={key} />
                </Td>
              </tr>
            );
          })}
        </tbody>
      </Table>
    </>
  );
}

/** A change in per cent with its sign, so that a rise is not read as a value. */
export const Signed = ({ percent, decimals = 1 }: { percent: number; decimals?: number }) => (
  <span className="whitespace-nowrap">
    {percent > 0 && <span className="font-num">+</span>}
    <Count value={percent} decimals={decimals} />
  </span>
);
