"use client";
import { useBench, useBenchActions, type Pinned } from "@/components/bench/bench-store";
import { Block } from "@/components/bench/panel/block";
import { Count, Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { Button } from "@/components/ui/button";
import { Td, Th } from "@/components/ui/table";
import type { SectionProperties } from "@/lib/section/properties";
import type { PropertyKey } from "@/lib/units/property-units";

const SHOWN = ["mass", "Ix", "Sx", "Zx", "Iy", "J"] as const satisfies readonly PropertyKey[];

/** Change in percent from the last revision, or from a state that was pinned. */
export const ChangeBlock = ({ p }: { p: SectionProperties }) => {
  const act = useBenchActions();
  const pinned = useBench((s) => s.pinned);
  const shape = useBench((s) => s.shape);
  const revision: Pinned | null = shape && {
    name: `Rev ${shape.revision.letter}`,
    properties: shape.revision.properties,
  };
  const from = pinned ?? revision;
  const pin = (
    <Button
      size="small"
      onClick={() =>
        act.set({
          pinned: pinned ? null : { name: "Pinned", properties: p },
        })
      }
    >
      {pinned ? "unpin" : "pin this state"}
    </Button>
  );
  return (
    <Block
      id="change"
      title="Change"
      note={
        pinned
          ? "from the pinned state"
          : revision
            ? `from revision ${shape?.revision.letter}`
            : "pin a state to compare with"
      }
      tools={pin}
    >
      {from && (
        <table className="w-full border-collapse text-table">
          <thead>
            <tr className="[&>th]:h-[34px] [&>th]:px-1.5 [&>th:first-child]:pl-3 [&>th:last-child]:pr-3">
              <Th>
                <span className="sr-only">State</span>
              </Th>
              {SHOWN.map((key) => (
                <Th key={key} numeric unit={<UnitOf property={key} />}>
                  <SymbolOf property={key} />
                </Th>
              ))}
            </tr>
          </thead>
          <tbody className="[&_td]:px-1.5 [&_td:last-child]:pr-3">
            <tr>
              <th scope="row" className="border-b border-rule pl-3 text-left font-regular text-ink-2">
                {from.name}
              </th>
              {SHOWN.map((key) => (
                <Td key={key} numeric>
                  <Quantity property={key} value={from.properties[key]} />
                </Td>
              ))}
            </tr>
            <tr>
              <th scope="row" className="pl-3 text-left font-regular text-ink-2">
                Change
              </th>
              {SHOWN.map((key) => {
                const [now, then] = [p[key], from.properties[key]];
                const percent = now === null || then === null || then === 0 ? null : (now / then - 1) * 100;
                return (
                  <Td key={key} numeric className="border-b-0">
                    {percent !== null && (
                      <>
                        {percent > 0.05 && "+"}
                        <b>
                          <Count value={percent} decimals={1} />
                        </b>{" "}
                        %
                      </>
                    )}
                  </Td>
                );
              })}
            </tr>
          </tbody>
        </table>
      )}
    </Block>
  );
};
