"use client";
import { Quantity, UnitOf } from "@/components/display/quantity";
import { PaneHead, Table, Td } from "@/components/ui/table";
import type { Drawing, DrawingMaterial } from "@/lib/drawing/schema";

const bandsOf = (material: DrawingMaterial) =>
  typeof material.fy === "number"
    ? [{ label: "Yield", fy: material.fy }]
    : material.fy.map((band, i, all) => ({
        label:
          i === 0
            ? `Yield, up to ${band.upTo} mm thick`
            : `Yield, over ${all[i - 1]?.upTo} to ${band.upTo} mm thick`,
        fy: band.fy,
      }));

/** The materials as they were typed with the drawing; the program brings no strengths of its own. */
export function MaterialsTable({ drawing }: { drawing: Drawing }) {
  const used = drawing.materials.filter((m) => drawing.parts.some((p) => !p.cutout && p.material === m.id));
  return used.map((material) => (
    <div key={material.id}>
      <PaneHead className="border-t border-frame">
        Material{" "}
        <span className="text-note font-regular text-ink-3">{material.name}, as typed with the drawing</span>
      </PaneHead>
      <Table className="[&_td]:h-[25px] [&_td]:max-md:h-[25px]">
        <tbody>
          {bandsOf(material).map((band) => (
            <tr key={band.label}>
              <Td className="pl-3 text-ink-2">{band.label}</Td>
              <Td className="italic">
                F<sub>y</sub>
              </Td>
              <Td numeric>
                <Quantity dimension="stress" value={band.fy} />
              </Td>
              <Td className="w-20 pl-0 text-note">
                <UnitOf dimension="stress" />
              </Td>
            </tr>
          ))}
          <tr>
            <Td className="pl-3 text-ink-2">Moduli</Td>
            <Td className="italic">E, G</Td>
            <Td numeric>
              <Quantity dimension="stress" value={material.E} />,{" "}
              <Quantity dimension="stress" value={material.G} />
            </Td>
            <Td className="w-20 pl-0 text-note">
              <UnitOf dimension="stress" />
            </Td>
          </tr>
          <tr>
            <Td className="pl-3 text-ink-2">Density</Td>
            <Td className="italic">ρ</Td>
            <Td numeric>
              <Quantity dimension="density" value={material.density} />
            </Td>
            <Td className="w-20 pl-0 text-note">
              <UnitOf dimension="density" />
            </Td>
          </tr>
        </tbody>
      </Table>
    </div>
  ));
}
