"use client";
import type { ReactNode } from "react";
import { Count, Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import type { SectionProperties } from "@/lib/section/properties";
import type { PropertyKey } from "@/lib/units/property-units";

type Line = Readonly<{
  name: string;
  property: PropertyKey;
  value: number | null;
  estimate?: number | null;
  note: ReactNode;
}>;

const absentNote = (p: SectionProperties, property: string): string | null =>
  p.absent.find((a) => a.property === property)?.detail ?? null;

const linesOf = (p: SectionProperties): Line[] => {
  const lines: Line[] = [];
  if (p.equalForceAxis)
    lines.push({
      name: "Equal-force axis",
      property: "pna.y",
      value: p.equalForceAxis.y,
      note: "parts differ in yield strength",
    });
  lines.push(
    {
      name: "Plastic moment, x",
      property: "Mp.x",
      value: p.Mp?.x ?? null,
      note: absentNote(p, "Mp") ?? "full yield",
    },
    {
      name: "Plastic moment, y",
      property: "Mp.y",
      value: p.Mp?.y ?? null,
      note: absentNote(p, "Mp") ?? "full yield",
    },
    {
      name: "Squash load",
      property: "squash",
      value: p.squash,
      note: absentNote(p, "squash") ?? "full yield",
    },
  );
  if (p.unsymmetrical)
    lines.push({
      name: "Free bending, least",
      property: "Sx",
      value: p.unsymmetrical.SxFree,
      note: (
        <>
          M<sub>x</sub> alone, factor <Count value={p.unsymmetrical.factorX} decimals={3} />
        </>
      ),
    });
  lines.push(
    {
      name: "Torsion constant",
      property: "J",
      value: p.J,
      estimate: p.estimates.J,
      note: absentNote(p, "J") ?? "",
    },
    {
      name: "Warping constant",
      property: "Cw",
      value: p.Cw,
      estimate: p.estimates.Cw,
      note: absentNote(p, "Cw") ?? "",
    },
    {
      name: "Polar radius about SC",
      property: "r0",
      value: p.r0,
      estimate: p.estimates.shearCentre,
      note: absentNote(p, "r0") ?? "",
    },
    ...(["Avx", "Avy"] as const).map((property) => ({
      name: property === "Avx" ? "Shear area, across" : "Shear area, up",
      property,
      value: p[property],
      note: absentNote(p, property) ?? "deflection, ν = 0",
    })),
    ...(["betaX", "betaY"] as const).map((property) => ({
      name: property === "betaX" ? "Asymmetry, x" : "Asymmetry, y",
      property,
      value: p[property],
      note: absentNote(p, property) ?? "",
    })),
  );
  return lines;
};

/** Estimates below a hundredth of a per cent are shown as that. */
const LEAST_SHOWN = 1e-4;

/** Strength, free bending and torsion: one value each, with what it rests on; a missing one says why. */
export const MoreProperties = ({ p }: { p: SectionProperties | null }) => {
  if (!p) return null;
  return (
    <table className="w-full table-fixed border-collapse border-t border-frame text-table">
      <tbody className="[&_td]:h-[22px] [&_td]:border-b [&_td]:border-rule [&_td]:px-1.5 [&_td]:whitespace-nowrap max-lg:[&_td]:h-8">
        {linesOf(p).map(({ name, property, value, estimate, note }) => (
          <tr key={name}>
            <th
              scope="row"
              className="w-[140px] border-b border-rule pl-3 text-left font-regular whitespace-nowrap text-ink-2"
            >
              {name}
            </th>
            <td className="w-9">
              <SymbolOf property={property} />
            </td>
            <td className="w-[74px] text-right [&_.figure]:font-[640]">
              <Quantity property={property} value={value} absent={<span className="text-ink-3">none</span>} />
            </td>
            <td className="w-[70px] text-note">
              <UnitOf property={property} />
            </td>
            <td
              className="truncate pr-3! text-right text-note text-ink-3"
              title={typeof note === "string" ? note : undefined}
            >
              {estimate !== null && estimate !== undefined && (
                <>
                  {estimate < LEAST_SHOWN ? "± under " : "± "}
                  <Count value={Math.max(estimate, LEAST_SHOWN) * 100} decimals={2} /> %{" "}
                </>
              )}
              {note}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
};
