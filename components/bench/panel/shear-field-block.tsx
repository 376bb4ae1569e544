"use client";
import { useMemo, useState } from "react";
import { Block } from "@/components/bench/panel/block";
import { Count, Quantity, UnitOf } from "@/components/display/quantity";
import { Select } from "@/components/ui/select";
import { fieldBands, type FieldName } from "@/lib/figure/field-bands";
import { silhouetteOf } from "@/lib/figure/silhouette";
import type { BenchFigures } from "@/lib/client/compute/bench-figures";

const BANDS = 8;

/** Stress in MPa for a round load: 1 kN·m of torque, 1 kN of shear. */
const LOADS: Readonly<Record<FieldName, Readonly<{ label: string; newtons: number; unit: string }>>> = {
  shearY: { label: "Shear along y", newtons: 1e3, unit: "MPa for 1 kN" },
  shearX: { label: "Shear along x", newtons: 1e3, unit: "MPa for 1 kN" },
  torsion: { label: "Torsion", newtons: 1e6, unit: "MPa for 1 kN·m" },
};
const NAMES = ["shearY", "shearX", "torsion"] as const;

const opacityOf = (band: number): number => (band + 0.5) / BANDS;

/** How shear and torsion flow through the section: shades of the shear stress, a legend, the greatest and what it leaves out. */
export const ShearFieldBlock = ({ figures }: { figures: BenchFigures }) => {
  const [name, setName] = useState<FieldName>("shearY");
  const fields = figures.torsion?.fields ?? null;
  const picture = useMemo(() => (fields === null ? null : fieldBands(fields, name, BANDS)), [fields, name]);
  const outline = silhouetteOf(figures.section);
  const { newtons, unit, label } = LOADS[name];
  const missing = figures.properties.absent.find(({ property }) => property === "Avy")?.detail;
  return (
    <Block
      id="shear-field"
      title="Shear stress"
      note="from the torsion and shear solution, ν = 0"
      tools={
        <Select
          aria-label="Load of the stress picture"
          value={name}
          choices={NAMES.map((value) => ({ value, label: LOADS[value].label }))}
          onChange={setName}
          className="h-6 text-table max-md:h-11"
        />
      }
    >
      {picture === null ? (
        <p className="px-3 py-2 text-table text-ink-2">{missing ?? "Computing."}</p>
      ) : (
        <div className="flex flex-wrap gap-4 px-3 py-3">
          <svg
            role="img"
            aria-label={`${label}: shades of the shear stress over the section`}
            viewBox={`${picture.box.x} ${picture.box.y} ${picture.box.width} ${picture.box.height}`}
            className="h-64 min-w-0 flex-1 basis-48 overflow-visible"
          >
            {picture.bands.map(({ path }, band) => (
              <path
                key={band}
                d={path}
                fill="var(--fb-oxide)"
                fillOpacity={opacityOf(band)}
                shapeRendering="crispEdges"
              />
            ))}
            {outline !== null && (
              <path
                d={outline.path}
                transform={`translate(${picture.box.x} ${picture.box.y + picture.box.height})`}
                fill="none"
                stroke="var(--fb-ink-2)"
                strokeWidth={1}
                vectorEffect="non-scaling-stroke"
              />
            )}
          </svg>
          <div className="text-note">
            <p className="mb-1 text-ink-3">{unit}</p>
            <ul>
              {picture.bands
                .map(({ to }, band) => (
                  <li key={band} className="flex h-5 items-center gap-2">
                    <svg aria-hidden width={18} height={12}>
                      <rect
                        width={18}
                        height={12}
                        fill="var(--fb-oxide)"
                        fillOpacity={opacityOf(band)}
                        stroke="var(--fb-edge)"
                      />
                    </svg>
                    <span className="sr-only">up to</span>
                    <Count value={to * newtons} decimals={decimalsFor(picture.greatest.value * newtons)} />
                  </li>
                ))
                .toReversed()}
            </ul>
          </div>
          <p className="basis-full text-note text-ink-2">
            Greatest at x <Quantity property="centroid.x" value={picture.greatest.at.x} />, y{" "}
            <Quantity property="centroid.y" value={picture.greatest.at.y} /> <UnitOf property="centroid.x" />.
            {picture.excludedCorners > 0 && (
              <>
                {" "}
                A tenth of the local thickness is left out round{" "}
                {picture.excludedCorners === 1
                  ? "the one re-entrant corner"
                  : `each of ${picture.excludedCorners} re-entrant corners`}
                : a sharp corner has no finite stress.
              </>
            )}
          </p>
        </div>
      )}
    </Block>
  );
};

/** Three significant digits of the greatest. */
const decimalsFor = (greatest: number): number =>
  greatest > 0 ? Math.min(9, Math.max(0, 2 - Math.floor(Math.log10(greatest)))) : 0;
