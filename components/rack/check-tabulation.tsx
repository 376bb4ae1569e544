"use client";
import { useMemo, useState } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { Quantity, UnitOf } from "@/components/display/quantity";
import { TickCell } from "@/components/rack/tick-cell";
import { Balloon } from "@/components/ui/marks";
import { Segmented } from "@/components/ui/choice";
import { PaneHead, Table, Td, Th, Tr } from "@/components/ui/table";
import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { tabulate, type TabulationAxis } from "@/lib/drawing/tabulation";
import { axisLetter } from "@/lib/units/notation";

type CheckTabulationProps = Readonly<{
  drawing: Drawing;
  ticked: ReadonlySet<string>;
  onTick: (row: string, on: boolean) => void;
}>;

/** The second moment of area by parallel axes, part by part, as it is done by hand; each row to be ticked. */
export default function CheckTabulation({ drawing, ticked, onTick }: CheckTabulationProps) {
  const { settings } = useDisplay();
  const [axis, setAxis] = useState<TabulationAxis>("x");
  const table = useMemo(() => {
    const section = sectionOf(drawing);
    return section.ok ? tabulate(section.value, axis) : null;
  }, [drawing, axis]);
  const nameOf = (id: string) => drawing.parts.find((p) => p.id === id)?.name || id;
  const letter = (name: TabulationAxis) => axisLetter(name, settings.notation);
  const level = letter(axis === "x" ? "y" : "x");
  return (
    <section aria-label="Tabulation">
      <PaneHead>
        Tabulation <span className="text-note font-regular text-ink-3">tick each row as you check it</span>
        <span className="flex-1" />
        <Segmented
          label="Axis"
          value={axis}
          onChange={setAxis}
          choices={[
            { value: "x", label: `${letter("x")}–${letter("x")}` },
            { value: "y", label: `${letter("y")}–${letter("y")}` },
          ]}
        />
      </PaneHead>
      {table?.ok ? (
        <div className="relative overflow-x-auto">
          <Table className="[&_td]:px-1.5 [&_td:first-child]:pl-3 [&_th]:px-1.5 [&_th:first-child]:pl-3">
            <thead>
              <tr>
                <Th className="pl-3">Part</Th>
                <Th numeric unit={<UnitOf property="area" />}>
                  <i>A</i>
                </Th>
                <Th numeric unit={<UnitOf dimension="length" />}>
                  <i>{level}</i>
                </Th>
                <Th numeric unit={<UnitOf dimension="modulus" />}>
                  <i>A·{level}</i>
                </Th>
                <Th numeric unit={<UnitOf dimension="length" />}>
                  <i>d</i>
                </Th>
                <Th numeric unit={<UnitOf property="Ix" />}>
                  <i>A·d</i>
                  <sup>2</sup>
                </Th>
                <Th numeric unit={<UnitOf property="Ix" />}>
                  <i>I</i>
                  <sub>0</sub>
                </Th>
                <Th>
                  <span className="sr-only">Checked</span>
                </Th>
              </tr>
            </thead>
            <tbody>
              {table.value.rows.map((row, i) => (
                <tr key={row.part}>
                  <Td className="pl-3">
                    <Balloon>{String(drawing.parts.findIndex((p) => p.id === row.part) + 1)}</Balloon>{" "}
                    {nameOf(row.part)}
                  </Td>
                  <Td numeric>
                    <Quantity property="area" value={row.area} />
                  </Td>
                  <Td numeric>
                    <Quantity dimension="length" value={row.at} />
                  </Td>
                  <Td numeric>
                    <Quantity dimension="modulus" value={row.firstMoment} />
                  </Td>
                  <Td numeric>
                    <Quantity dimension="length" value={row.distance} />
                  </Td>
                  <Td numeric>
                    <Quantity property="Ix" value={row.areaDistance2} decimals={2} />
                  </Td>
                  <Td numeric>
                    <Quantity property="Ix" value={row.own} decimals={2} />
                  </Td>
                  <TickCell
                    label={`Row ${i + 1}, ${nameOf(row.part)}, is checked about ${axis}`}
                    checked={ticked.has(`${axis} ${row.part}`)}
                    onChange={(on) => onTick(`${axis} ${row.part}`, on)}
                  />
                </tr>
              ))}
              <Tr total>
                <Td className="pl-3">Sum</Td>
                <Td numeric>
                  <Quantity property="area" value={table.value.sum.area} />
                </Td>
                <Td />
                <Td numeric>
                  <Quantity dimension="modulus" value={table.value.sum.firstMoment} />
                </Td>
                <Td />
                <Td numeric>
                  <Quantity property="Ix" value={table.value.sum.areaDistance2} decimals={2} />
                </Td>
                <Td numeric>
                  <Quantity property="Ix" value={table.value.sum.own} decimals={2} />
                </Td>
                <TickCell
                  label={`The sums about ${axis} are checked`}
                  checked={ticked.has(`${axis} sum`)}
                  onChange={(on) => onTick(`${axis} sum`, on)}
                />
              </Tr>
            </tbody>
          </Table>
        </div>
      ) : (
        <p className="p-3 text-note text-ink-3">This drawing has no tabulation.</p>
      )}
    </section>
  );
}
