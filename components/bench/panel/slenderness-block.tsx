"use client";
import { useItems } from "@/components/bench/bench-store";
import { Block } from "@/components/bench/panel/block";
import { Count, Quantity, UnitOf } from "@/components/display/quantity";
import { Balloon } from "@/components/ui/marks";
import { Td, Th } from "@/components/ui/table";
import type { Slenderness } from "@/lib/drawing/slenderness";

/** b/t facts: widths from face to free edge or between faces, without fillets; the code's limits are not applied. */
export const SlendernessBlock = ({ facts }: { facts: readonly Slenderness[] }) => {
  const items = useItems();
  if (facts.length === 0) return null;
  return (
    <Block id="slenderness" title="b/t" note="fillets and welds left out; no class is derived">
      <table className="w-full border-collapse text-table">
        <thead>
          <tr className="[&>th]:px-1.5 [&>th:first-child]:pl-3 [&>th:last-child]:pr-3">
            <Th>Part</Th>
            <Th>From</Th>
            <Th numeric unit={<UnitOf dimension="length" />}>
              b
            </Th>
            <Th numeric unit={<UnitOf dimension="length" />}>
              t
            </Th>
            <Th numeric>b/t</Th>
          </tr>
        </thead>
        <tbody className="[&_td]:px-1.5 [&_td:first-child]:pl-3 [&_td:last-child]:pr-3">
          {facts.map((f) => (
            <tr key={`${f.part}-${f.element}-${f.kind}`}>
              <Td>
                <span className="inline-flex items-center gap-2">
                  <Balloon>{items.get(f.part)}</Balloon> {f.element}
                </span>
              </Td>
              <Td className="text-ink-2">{f.kind}</Td>
              <Td numeric>
                <Quantity dimension="length" value={f.width} />
              </Td>
              <Td numeric>
                <Quantity dimension="length" value={f.thickness} />
              </Td>
              <Td numeric>
                <b>
                  <Count value={f.ratio} decimals={1} />
                </b>
              </Td>
            </tr>
          ))}
        </tbody>
      </table>
    </Block>
  );
};
