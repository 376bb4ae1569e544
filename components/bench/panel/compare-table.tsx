"use client";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { Td, Th } from "@/components/ui/table";
import type { SectionProperties } from "@/lib/section/properties";
import type { PropertyKey } from "@/lib/units/property-units";

const ROWS = [
  "area",
  "mass",
  "Ix",
  "Iy",
  "Sx",
  "Sy",
  "Zx",
  "Zy",
  "rx",
  "ry",
] as const satisfies readonly PropertyKey[];

/** The main figures of one or two sections side by side. */
export const CompareTable = ({
  columns,
}: {
  columns: readonly Readonly<{ name: string; properties: SectionProperties }>[];
}) => (
  <table className="w-full border-collapse text-table">
    <thead>
      <tr className="[&>th:first-child]:pl-3 [&>th:last-child]:pr-3">
        <Th>
          <span className="sr-only">Property</span>
        </Th>
        <Th>
          <span className="sr-only">Unit</span>
        </Th>
        {columns.map((c) => (
          <Th key={c.name} numeric>
            {c.name}
          </Th>
        ))}
      </tr>
    </thead>
    <tbody className="[&_td:last-child]:pr-3">
      {ROWS.map((key) => (
        <tr key={key}>
          <th scope="row" className="border-b border-rule pl-3 text-left font-regular">
            <SymbolOf property={key} />
          </th>
          <Td className="text-note">
            <UnitOf property={key} />
          </Td>
          {columns.map((c) => (
            <Td key={c.name} numeric>
              <Quantity property={key} value={c.properties[key]} />
            </Td>
          ))}
        </tr>
      ))}
      <tr>
        <th scope="row" className="pl-3 text-left font-regular">
          Centroid
        </th>
        <Td className="border-b-0 text-note">
          <UnitOf property="centroid.y" />
        </Td>
        {columns.map((c) => (
          <Td key={c.name} numeric className="border-b-0">
            <Quantity property="centroid.x" value={c.properties.centroid.x} />,{" "}
            <Quantity property="centroid.y" value={c.properties.centroid.y} />
          </Td>
        ))}
      </tr>
    </tbody>
  </table>
);
