"use client";
import type { ReactNode } from "react";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { PROPERTY_NAME } from "@/lib/units/property-names";
import type { PropertyKey } from "@/lib/units/property-units";
import type { SectionProperties } from "@/lib/section/properties";

const Pair = ({
  name,
  property,
  value,
}: {
  name: ReactNode;
  property: PropertyKey;
  value: number | null | undefined;
}) => (
  <div className="grid h-6 grid-cols-[94px_22px_1fr_44px] items-baseline gap-1 px-3 text-table max-lg:h-[30px]">
    <span className="text-ink-2">{name}</span>
    <SymbolOf property={property} />
    <span className="text-right">
      <Quantity property={property} value={value} />
    </span>
    <UnitOf property={property} className="text-note" />
  </div>
);

/** Area, mass, centroid, shear centre, principal angle, painted surface. */
export const Overview = ({ p }: { p: SectionProperties | null }) => (
  <div className="grid grid-cols-2 border-b border-rule py-1 max-sm:grid-cols-1 [&>div]:min-w-0">
    <div>
      <Pair name="Area" property="area" value={p?.area} />
      <Pair name="Centroid" property="centroid.x" value={p?.centroid.x} />
      <Pair name="Shear centre" property="shearCentre.x" value={p?.shearCentre?.x} />
      <Pair name="Principal angle" property="angle" value={p?.angle} />
    </div>
    <div className="border-l border-rule max-sm:border-l-0">
      <Pair name={PROPERTY_NAME.mass} property="mass" value={p?.mass} />
      <Pair name="" property="centroid.y" value={p?.centroid.y} />
      <Pair name="" property="shearCentre.y" value={p?.shearCentre?.y} />
      <Pair name="Painted" property="surface" value={p?.surface} />
    </div>
  </div>
);
