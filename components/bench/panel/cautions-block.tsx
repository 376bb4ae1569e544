"use client";
import { Block } from "@/components/bench/panel/block";
import type { SectionProperties } from "@/lib/section/properties";

/** What the figures rest on, what is missing and why, and what nobody has checked. */
export const CautionsBlock = ({ p }: { p: SectionProperties }) => (
  <Block id="cautions" title="Assumptions and cautions">
    <ul className="list-disc py-2 pr-3 pl-7 text-table leading-[19px] text-ink-2">
      <li>Plane sections stay plane; parts act as one, fully joined. Weld metal is left out.</li>
      <li>
        Elastic figures are of the gross section less the holes drawn; plastic ones assume full yield
        everywhere.
      </li>
      {p.plain && <li>Where E differs, figures are transformed to the reference material.</li>}
      <li>
        <b className="font-[560] text-ink">Not checked:</b> local, lateral and torsional-flexural buckling,
        web bearing, connections, fatigue, fire, corrosion, the code&apos;s factors.
      </li>
      <li>Local codes and a licensed engineer decide.</li>
      {[...new Set(p.absent.map((a) => a.detail))].map((detail) => (
        <li key={detail}>{detail}</li>
      ))}
    </ul>
  </Block>
);
