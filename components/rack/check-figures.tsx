"use client";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { QuantityField } from "@/components/display/quantity-field";
import { Signed } from "@/components/rack/both-figures";
import { percentChange, propertyValue } from "@/components/rack/property-value";
import { TickCell } from "@/components/rack/tick-cell";
import { cx } from "@/components/ui/cx";
import { PaneHead, Table, Td, Th } from "@/components/ui/table";
import type { Properties } from "@/lib/schemas/properties";
import { PROPERTY_NAME } from "@/lib/units/property-names";
import type { PropertyKey } from "@/lib/units/property-units";

export const CHECKED_KEYS = ["area", "centroid.y", "Ix", "SxTop", "SxBottom", "Zx", "Iy", "Ixy"] as const;
export type OwnFigures = Readonly<Partial<Record<PropertyKey, number>>>;

/** Per cent from which a checker's own figure stands on chalk. */
const FAR_PERCENT = 1;

type CheckFiguresProps = Readonly<{
  properties: Properties;
  own: OwnFigures;
  onOwn: (key: PropertyKey, value: number | null) => void;
  ticked: ReadonlySet<string>;
  onTick: (row: string, on: boolean) => void;
}>;

/** The checker's own figures beside the computed ones, where one was worked out. */
export const CheckFigures = ({ properties, own, onOwn, ticked, onTick }: CheckFiguresProps) => (
  <section aria-label="Figures">
    <PaneHead className="border-t border-frame">
      Figures{" "}
      <span className="text-note font-regular text-ink-3">
        yours beside the computed, where you worked one out
      </span>
    </PaneHead>
    <Table className="[&_td]:h-7">
      <thead>
        <tr>
          <Th className="pl-3">
            <span className="sr-only">Property</span>
          </Th>
          <Th>
            <span className="sr-only">Symbol and unit</span>
          </Th>
          <Th numeric>Computed</Th>
          <Th numeric>Yours</Th>
          <Th numeric unit="%">
            Off
          </Th>
          <Th>
            <span className="sr-only">Checked</span>
          </Th>
        </tr>
      </thead>
      <tbody>
        {CHECKED_KEYS.map((key) => {
          const computed = propertyValue(properties, key);
          const mine = own[key] ?? null;
          const off = percentChange(computed, mine);
          return (
            <tr key={key} className={cx(off !== null && Math.abs(off) > FAR_PERCENT && "bg-chalk-wash")}>
              <Td className="pl-3 text-ink-2">{PROPERTY_NAME[key]}</Td>
              <Td className="text-note">
                <SymbolOf property={key} /> <UnitOf property={key} />
              </Td>
              <Td numeric>
                <Quantity property={key} value={computed} className="font-[640]" />
              </Td>
              <Td numeric>
                <QuantityField
                  property={key}
                  value={mine}
                  optional
                  bare
                  onCommit={(value) => onOwn(key, value)}
                  aria-label={`Your ${PROPERTY_NAME[key]}`}
                />
              </Td>
              <Td numeric>{off !== null && <Signed percent={off} decimals={2} />}</Td>
              <TickCell
                label={`${PROPERTY_NAME[key]} is checked`}
                checked={ticked.has(key)}
                onChange={(on) => onTick(key, on)}
              />
            </tr>
          );
        })}
      </tbody>
    </Table>
  </section>
);
