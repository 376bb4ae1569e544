"use client";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { When } from "@/components/display/when";
import { Signed } from "@/components/rack/both-figures";
import { percentChange, propertyValue } from "@/components/rack/property-value";
import { PaneHead, Table, Td, Th } from "@/components/ui/table";
import type { RevisionRecord } from "@/lib/schemas/shape";

const KEYS = ["mass", "Ix", "Sx", "Zx", "Iy", "ry", "J", "Cw"] as const;

/** What changed from one revision to the next, figure by figure. */
export const ChangeTable = ({ from, to }: { from: RevisionRecord; to: RevisionRecord }) => (
  <section aria-label={`Change from revision ${from.letter}`}>
    <PaneHead className="border-t border-frame">
      Change from revision {from.letter}
      {from.released && (
        <span className="text-note font-regular text-ink-3">
          released <When at={from.released.at} />
        </span>
      )}
    </PaneHead>
    <Table>
      <thead>
        <tr>
          <Th className="pl-3">
            <span className="sr-only">Property</span>
          </Th>
          <Th>
            <span className="sr-only">Unit</span>
          </Th>
          <Th numeric>Rev {from.letter}</Th>
          <Th numeric>Rev {to.letter}</Th>
          <Th numeric unit="%">
            Change
          </Th>
        </tr>
      </thead>
      <tbody>
        {KEYS.map((key) => {
          const before = propertyValue(from.computed, key);
          const after = propertyValue(to.computed, key);
          const change = percentChange(before, after);
          return (
            <tr key={key}>
              <Td className="pl-3">
                <SymbolOf property={key} />
              </Td>
              <Td className="text-note">
                <UnitOf property={key} />
              </Td>
              <Td numeric>
                <Quantity property={key} value={before} />
              </Td>
              <Td numeric>
                <Quantity property={key} value={after} className="font-[640]" />
              </Td>
              <Td numeric>{change !== null && <Signed percent={change} />}</Td>
            </tr>
          );
        })}
      </tbody>
    </Table>
  </section>
);
