"use client";
import type { ReactNode } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { Count, Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { absentReason, countingValue, type Figures } from "@/components/rack/property-value";
import { cx } from "@/components/ui/cx";
import { Table, Td, Th } from "@/components/ui/table";
import { UnsymmetricalSign, WarningSign } from "@/components/ui/signs";
import { axisLetter } from "@/lib/units/notation";
import { PROPERTY_NAME } from "@/lib/units/property-names";
import type { PropertyKey } from "@/lib/units/property-units";

type TablesProps = Readonly<{ figures: Figures }>;

/** Every property of a revision, by the axis it is about; the figures that count in the bay. */
export function PropertyTables({ figures }: TablesProps) {
  const { computed } = figures;
  const composite = computed.plain !== null;
  const principal = computed.unsymmetrical !== null || Math.abs(computed.angle) > 0.1;
  return (
    <>
      <SingleTable label="Section">
        <SingleRow figures={figures} property="mass" />
        <SingleRow figures={figures} property="area" />
        <FromUnderside figures={figures} name="Centroid above underside" property="centroid.y" />
        <FromUnderside figures={figures} name="Shear centre above underside" property="shearCentre.y" />
        <FromUnderside figures={figures} name="Plastic axis, equal areas" property="pna.y" />
        <SingleRow figures={figures} property="surface" />
      </SingleTable>
      <AxisTable figures={figures} />
      {principal && (
        <SingleTable label="Principal axes">
          {(["Ixy", "I1", "I2", "angle", "S1", "S2", "Z1", "Z2", "r1", "r2"] as const).map((key) => (
            <SingleRow key={key} figures={figures} property={key} />
          ))}
        </SingleTable>
      )}
      {computed.unsymmetrical && (
        <p className="flex gap-2 border-b border-frame px-3 py-1.5 text-table">
          <UnsymmetricalSign className="mt-0.5" />
          <span>
            <b>Unsymmetrical.</b>{" "}
            <span className="text-ink-2">
              Under M<sub>x</sub> alone the true extreme stress is ×
              <Count value={computed.unsymmetrical.factorX} decimals={2} /> M/S, under M<sub>y</sub> alone ×
              <Count value={computed.unsymmetrical.factorY} decimals={2} />. For free bending count with{" "}
              <SymbolOf property="Sx" /> <Quantity property="Sx" value={computed.unsymmetrical.SxFree} /> and{" "}
              <SymbolOf property="Sy" /> <Quantity property="Sy" value={computed.unsymmetrical.SyFree} />{" "}
              <UnitOf property="Sx" />.
            </span>
          </span>
        </p>
      )}
      <SingleTable label="Torsion, shear and strength">
        {(["J", "Cw", "Avx", "Avy", "Mp.x", "Mp.y", "squash"] as const).map((key) => (
          <SingleRow key={key} figures={figures} property={key} />
        ))}
      </SingleTable>
      {composite && <PlainTable figures={figures} />}
      {computed.warnings.length > 0 && (
        <ul className="border-b border-frame px-3 py-1.5 text-table">
          {computed.warnings.map((warning) => (
            <li key={warning.code + warning.parts.join()} className="flex gap-2">
              <WarningSign className="mt-0.5" />
              <span>{warning.detail}</span>
            </li>
          ))}
        </ul>
      )}
    </>
  );
}

const SingleTable = ({ label, children }: { label: string; children: ReactNode }) => (
  <Table aria-label={label} className="table-fixed [&_tr:last-child>*]:border-b-frame">
    <colgroup>
      <col />
      <col className="w-[46px]" />
      <col className="w-[92px]" />
      <col className="w-[80px]" />
    </colgroup>
    <tbody>{children}</tbody>
  </Table>
);

const Name = ({ children }: { children: ReactNode }) => (
  <th scope="row" className="h-[25px] truncate border-b border-rule pl-3 text-left font-regular text-ink-2">
    {children}
  </th>
);

const UnitCell = ({ property }: { property: PropertyKey }) => (
  <Td className="h-[25px] max-md:h-[25px] pl-0 text-note">
    <UnitOf property={property} />
  </Td>
);

function Absent({ figures, property }: TablesProps & { property: PropertyKey }) {
  const reason = absentReason(figures.computed, property);
  return (
    <span className="font-ui text-note text-ink-3" title={reason ?? undefined}>
      {reason ? "not computed" : ""}
    </span>
  );
}

function Figure({ figures, property, strong }: TablesProps & { property: PropertyKey; strong?: boolean }) {
  const { value } = countingValue(figures, property);
  return (
    <Quantity
      property={property}
      value={value}
      absent={<Absent figures={figures} property={property} />}
      {...(strong && { className: "font-[640]" })}
    />
  );
}

const SingleRow = ({ figures, property }: TablesProps & { property: PropertyKey }) => (
  <tr>
    <Name>{PROPERTY_NAME[property]}</Name>
    <Td className="h-[25px] max-md:h-[25px]">
      <SymbolOf property={property} />
    </Td>
    <Td numeric className="h-[25px] max-md:h-[25px]">
      <Figure figures={figures} property={property} />
    </Td>
    <UnitCell property={property} />
  </tr>
);

/** A level measured from the underside of the section, as a shop measures it. */
function FromUnderside({
  figures,
  name,
  property,
}: TablesProps & { name: string; property: "centroid.y" | "shearCentre.y" | "pna.y" }) {
  const { value } = countingValue(figures, property);
  return (
    <tr>
      <Name>{name}</Name>
      <Td className="h-[25px] max-md:h-[25px]">
        <SymbolOf property={property} />
      </Td>
      <Td numeric className="h-[25px] max-md:h-[25px]">
        <Quantity
          property={property}
          value={value === null ? null : value - figures.computed.extents.yMin}
          absent={<Absent figures={figures} property={property} />}
        />
      </Td>
      <UnitCell property={property} />
    </tr>
  );
}

const AXIS_ROWS = [
  ["Second moment of area", "Ix", "Iy"],
  ["Elastic modulus, top, left", "SxTop", "SyLeft"],
  ["Elastic modulus, foot, right", "SxBottom", "SyRight"],
  ["Plastic modulus", "Zx", "Zy"],
  ["Radius of gyration", "rx", "ry"],
] as const;
const LETTER: Record<string, PropertyKey> = { Ix: "Ix", SxTop: "Sx", SxBottom: "Sx", Zx: "Zx", rx: "rx" };

function AxisTable({ figures }: TablesProps) {
  const { settings } = useDisplay();
  const axis = (name: "x" | "y") =>
    `${axisLetter(name, settings.notation)}–${axisLetter(name, settings.notation)}`;
  const { Sx, Sy, Zx, Zy } = figures.computed;
  return (
    <Table className="table-fixed [&_tr:last-child>*]:border-b-frame">
      <colgroup>
        <col />
        <col className="w-[30px]" />
        <col className="w-[72px]" />
        <col className="w-[62px]" />
        <col className="w-[80px]" />
      </colgroup>
      <thead className="bg-panel">
        <tr>
          <Th className="pl-3">About</Th>
          <Th>
            <span className="sr-only">Symbol</span>
          </Th>
          <Th numeric>{axis("x")}</Th>
          <Th numeric>{axis("y")}</Th>
          <Th>
            <span className="sr-only">Unit</span>
          </Th>
        </tr>
      </thead>
      <tbody>
        {AXIS_ROWS.map(([name, x, y]) => (
          <tr key={x}>
            <Name>{name}</Name>
            <Td className="h-[25px] max-md:h-[25px]">
              <BareSymbol property={LETTER[x] ?? x} />
            </Td>
            <Td numeric className="h-[25px] max-md:h-[25px]">
              <Figure figures={figures} property={x} strong />
            </Td>
            <Td numeric className="h-[25px] max-md:h-[25px]">
              <Figure figures={figures} property={y} />
            </Td>
            <UnitCell property={x} />
          </tr>
        ))}
        <tr>
          <Name>Shape factor, Z over least S</Name>
          <Td className="h-[25px] max-md:h-[25px]" />
          <Td numeric className="h-[25px] max-md:h-[25px]">
            {Zx !== null && <Count value={Zx / Sx} decimals={2} className="font-[640]" />}
          </Td>
          <Td numeric className="h-[25px] max-md:h-[25px]">
            {Zy !== null && <Count value={Zy / Sy} decimals={2} />}
          </Td>
          <Td className="h-[25px] max-md:h-[25px]" />
        </tr>
      </tbody>
    </Table>
  );
}

/** The letter of a symbol without its axis: the column says which axis is meant. */
function BareSymbol({ property }: { property: PropertyKey }) {
  return <SymbolOf property={property} className="[&>sub]:hidden" />;
}

const PLAIN = ["area", "Ix", "Iy", "Ixy", "Sx", "Sy", "rx", "ry"] as const;

/** Where E differs between parts the values above are transformed; these are the plain geometric ones. */
function PlainTable({ figures }: TablesProps) {
  const plain = figures.computed.plain;
  if (!plain) return null;
  return (
    <>
      <p className={cx("bg-panel px-3 py-1 text-note text-ink-2")}>
        The values above are transformed for the reference material; the plain geometric ones:
      </p>
      <SingleTable label="Plain geometric values">
        {PLAIN.map((key) => (
          <tr key={key}>
            <Name>{PROPERTY_NAME[key]}</Name>
            <Td className="h-[25px] max-md:h-[25px]">
              <SymbolOf property={key} />
            </Td>
            <Td numeric className="h-[25px] max-md:h-[25px]">
              <Quantity property={key} value={plain[key]} />
            </Td>
            <UnitCell property={key} />
          </tr>
        ))}
      </SingleTable>
    </>
  );
}
