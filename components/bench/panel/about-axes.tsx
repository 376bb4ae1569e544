"use client";
import { useDisplay } from "@/components/display/display-provider";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { Th } from "@/components/ui/table";
import type { SectionProperties } from "@/lib/section/properties";
import { propertyRule } from "@/lib/units/display-units";
import { columnDecimals } from "@/lib/units/format";
import { axisLetter } from "@/lib/units/notation";
import type { PropertyKey } from "@/lib/units/property-units";

type Row = Readonly<{
  name: string;
  property: PropertyKey;
  values: (p: SectionProperties) => readonly (number | null)[];
}>;

const ROWS: readonly Row[] = [
  { name: "Second moment of area", property: "I1", values: (p) => [p.Ix, p.Iy, p.I1, p.I2] },
  { name: "Product of inertia", property: "Ixy", values: (p) => [p.Ixy] },
  { name: "Elastic, top or right", property: "S1", values: (p) => [p.SxTop, p.SyRight] },
  { name: "Elastic, bottom or left", property: "S1", values: (p) => [p.SxBottom, p.SyLeft] },
  { name: "Elastic, least", property: "S1", values: (p) => [p.Sx, p.Sy, p.S1, p.S2] },
  { name: "Plastic modulus", property: "Z1", values: (p) => [p.Zx, p.Zy, p.Z1, p.Z2] },
  {
    name: "Plastic axis, equal areas",
    property: "pna.y",
    values: (p) => [p.pna?.y ?? null, p.pna?.x ?? null],
  },
  { name: "Radius of gyration", property: "r1", values: (p) => [p.rx, p.ry, p.r1, p.r2] },
];

/** Letter of a symbol without its axis: the axis stands in the column. */
const Letter = ({ property }: { property: PropertyKey }) => (
  <SymbolOf property={property} className="[&>sub]:hidden" />
);

/** Properties about x–x, y–y and the principal axes; the first column is the decisive one. */
export const AboutAxes = ({ p }: { p: SectionProperties | null }) => {
  const { settings } = useDisplay();
  const axes = (["x", "y", "1", "2"] as const).map((a) => axisLetter(a, settings.notation));
  return (
    <table className="w-full border-collapse text-table">
      <thead>
        <tr>
          <Th className="pl-3">About</Th>
          <Th>
            <span className="sr-only">Symbol</span>
          </Th>
          <Th>
            <span className="sr-only">Unit</span>
          </Th>
          {axes.map((a) => (
            <Th key={a} numeric className="px-1.5 last:pr-3">
              {a}–{a}
            </Th>
          ))}
        </tr>
      </thead>
      <tbody className="[&_td]:h-6 [&_td]:border-b [&_td]:border-rule [&_td]:px-1.5 [&_td]:whitespace-nowrap max-lg:[&_td]:h-8">
        {ROWS.map(({ name, property, values }) => {
          const found = p ? values(p) : [];
          const rule = propertyRule(property, settings.system);
          // A place near 0 is rounding: it must not give the column more decimals.
          const decimals = property === "pna.y" ? rule.decimals : columnDecimals(found, rule);
          return (
            <tr key={name}>
              <th
                scope="row"
                className="border-b border-rule pl-3 text-left font-regular whitespace-nowrap text-ink-2"
              >
                {name}
              </th>
              <td>
                {property === "Ixy" ? (
                  <SymbolOf property="Ixy" />
                ) : property === "pna.y" ? null : (
                  <Letter property={property} />
                )}
              </td>
              <td className="text-note">
                <UnitOf property={property} />
              </td>
              {axes.map((a, i) => (
                <td
                  key={a}
                  className={i === 0 ? "text-right [&_.figure]:font-[640]" : "text-right last:pr-3!"}
                >
                  <Quantity property={property} value={found[i] ?? null} decimals={decimals} />
                </td>
              ))}
            </tr>
          );
        })}
      </tbody>
    </table>
  );
};
