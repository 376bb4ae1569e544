"use client";
import { useBench, useBenchActions, useItems } from "@/components/bench/bench-store";
import { Block } from "@/components/bench/panel/block";
import { useDisplay } from "@/components/display/display-provider";
import { Count, UnitOf } from "@/components/display/quantity";
import { QuantityField } from "@/components/display/quantity-field";
import { Balloon } from "@/components/ui/marks";
import { Select } from "@/components/ui/select";
import { Td, Th } from "@/components/ui/table";
import { changeJoint, JOINT_KINDS } from "@/lib/drawing/joints";
import type { DrawingJoint } from "@/lib/drawing/schema";
import { jointOf } from "@/lib/figure/welds";
import type { BenchFigures } from "@/lib/client/compute/bench-figures";
import { WORDS } from "@/lib/units/notation";

const positive = (mm: number) => (mm > 0 ? null : "A size above 0, or leave it empty.");

/** Every pair of parts that touch, with kind and size of what joins them and the shear it takes per unit of shear force. */
export const JointsBlock = ({ figures }: { figures: BenchFigures }) => {
  const act = useBenchActions();
  const joints = useBench((s) => s.history.now.joints);
  const items = useItems();
  const { settings } = useDisplay();
  const words = WORDS[settings.notation];
  const names: Record<DrawingJoint["kind"], string> = {
    fillet: "fillet weld",
    cjp: words.fullPenetration,
    pjp: words.partPenetration,
    bolts: "bolts",
    none: "none",
  };
  const item = (id: string) => items.get(id);
  return (
    <Block
      id="joints-block"
      title="Joints"
      note="between parts that touch; weld metal is left out of every figure"
    >
      <div id="joints">
        {figures.section.contacts.length === 0 ? (
          <p className="px-3 py-2 text-table text-ink-2">No two parts touch along an edge.</p>
        ) : (
          <table className="w-full border-collapse text-table">
            <thead>
              <tr className="[&>th]:h-[34px] [&>th]:px-1 [&>th:first-child]:pl-3 [&>th:last-child]:pr-3">
                <Th>Parts</Th>
                <Th>Kind</Th>
                <Th numeric unit={<UnitOf dimension="length" />}>
                  Size
                </Th>
                <Th numeric unit={<UnitOf dimension="length" />}>
                  Length
                </Th>
                <Th numeric unit={<UnitOf dimension="length" />}>
                  Pitch
                </Th>
                <Th numeric unit="N/mm for 1 kN">
                  Shear flow
                </Th>
              </tr>
            </thead>
            <tbody className="[&_td]:px-1 [&_td:first-child]:pl-3 [&_td:last-child]:pr-3">
              {figures.section.contacts.map(({ parts }) => {
                const [a, b] = parts;
                const pair = `${item(a)}–${item(b)}`;
                const joint = jointOf(joints, parts);
                const force = figures.jointForces.find((f) => f.parts.includes(a) && f.parts.includes(b));
                const change = (next: Partial<DrawingJoint>) => act.edit((d) => changeJoint(d, parts, next));
                const size = (key: "size" | "length" | "pitch", name: string) => (
                  <Td className="h-7 w-[68px]">
                    <QuantityField
                      bare
                      optional
                      aria-label={`${name} of joint ${pair}`}
                      value={joint?.[key] ?? null}
                      refuse={positive}
                      onCommit={(mm) => change({ [key]: mm })}
                      inputClassName="w-full"
                    />
                  </Td>
                );
                return (
                  <tr
                    key={`${a} ${b}`}
                    onPointerEnter={() => act.hover(a)}
                    onPointerLeave={() => act.hover(null)}
                  >
                    <Td className="h-7">
                      <span className="inline-flex items-center gap-0.5">
                        <Balloon>{item(a)}</Balloon>–<Balloon>{item(b)}</Balloon>
                      </span>
                    </Td>
                    <Td className="h-7">
                      <Select
                        aria-label={`Kind of joint ${pair}`}
                        value={joint?.kind ?? "fillet"}
                        choices={JOINT_KINDS.map((value) => ({ value, label: names[value] }))}
                        onChange={(kind) => change({ kind })}
                        className="h-6 w-full text-table"
                      />
                    </Td>
                    {size("size", "Size")}
                    {size("length", "Length")}
                    {size("pitch", "Pitch")}
                    <Td numeric className="h-7" title={force?.absent?.detail}>
                      {force?.perVy === null || force?.perVy === undefined ? (
                        <span className="text-note text-ink-3">{force?.absent ? "closed cell" : ""}</span>
                      ) : (
                        <Count value={Math.abs(force.perVy) * 1000} decimals={2} />
                      )}
                    </Td>
                  </tr>
                );
              })}
            </tbody>
          </table>
        )}
      </div>
    </Block>
  );
};
