"use client";
import dynamic from "next/dynamic";
import { useEffect, useRef, useState } from "react";
import { When } from "@/components/display/when";
import { Stamp } from "@/components/ui/marks";
import { AwaitedLine } from "@/components/ui/waiting";
import type { Drawing } from "@/lib/drawing/schema";
import type { RevisionRecord } from "@/lib/schemas/shape";

const ShapeFigure = dynamic(() => import("@/components/rack/shape-figure"), {
  ssr: false,
  loading: () => <AwaitedLine>drawing the section</AwaitedLine>,
});

/** True scales of a print on A4, largest first; and the room that a figure has there without its dimensions, mm. */
const SCALES = [1, 2, 5, 10, 20] as const;
const ROOM_ON_A4_MM = { width: 88, height: 118 };
/** A CSS px is 1/96 in. */
const PX_PER_MM_ON_PAPER = 96 / 25.4;

export function scaleOnA4(
  extents: Readonly<{ xMin: number; xMax: number; yMin: number; yMax: number }>,
): number {
  const fits = (n: number) =>
    (extents.xMax - extents.xMin) / n <= ROOM_ON_A4_MM.width &&
    (extents.yMax - extents.yMin) / n <= ROOM_ON_A4_MM.height;
  return SCALES.find(fits) ?? SCALES[SCALES.length - 1] ?? 20;
}

type SheetFigureProps = Readonly<{ designation: string; revision: RevisionRecord; under: Drawing | null }>;

/** The section as large as the sheet lets it be; in print at a true scale, named in the caption. */
export function SheetFigure({ designation, revision, under }: SheetFigureProps) {
  const frame = useRef<HTMLDivElement>(null);
  const [size, setSize] = useState<Readonly<{ width: number; height: number }> | null>(null);
  useEffect(() => {
    const box = frame.current;
    if (!box) return;
    const observer = new ResizeObserver(([entry]) => {
      const { width = 0, height = 0 } = entry?.contentRect ?? {};
      if (width > 40 && height > 40) setSize({ width: Math.floor(width), height: Math.floor(height) });
    });
    observer.observe(box);
    return () => observer.disconnect();
  }, []);
  const scale = scaleOnA4(revision.computed.extents);
  const label = `Section of ${designation}, revision ${revision.letter}`;
  const across = ACROSS[revision.state];
  return (
    <section
      aria-label="Section"
      className="relative min-h-0 min-w-0 overflow-hidden max-md:h-[460px] print:min-h-[150mm]"
    >
      <header className="absolute top-3 left-4 z-[1] text-table text-ink-2">
        <h2 className="text-title font-bold text-ink">Section</h2>
        <span>1 : {scale} on A4</span>
        {revision.state === "draft" && <b className="block text-oxide-ink">draft, not for cutting</b>}
      </header>
      {revision.released && (revision.state === "released" || revision.state === "superseded") && (
        <div className="absolute top-6 right-[26px] z-[1] max-md:top-1 max-md:-right-3">
          <Stamp
            word="Released"
            lines={[
              <>
                revision {revision.letter} · <When at={revision.released.at} />
              </>,
              revision.released.by.name,
            ]}
            className="max-md:scale-75"
          />
        </div>
      )}
      {across && (
        <p
          aria-hidden
          className="pointer-events-none absolute inset-x-0 top-1/2 z-[1] -rotate-[24deg] text-center text-[56px] leading-none font-[760] tracking-[.06em] text-oxide-ink uppercase opacity-70 max-md:text-[34px]"
        >
          {across}
        </p>
      )}
      <div
        ref={frame}
        className="absolute inset-x-5 top-[104px] bottom-4 flex items-center justify-center max-md:top-[92px] print:hidden"
      >
        {size && (
          <ShapeFigure
            drawing={revision.drawing}
            properties={revision.computed}
            label={label}
            fit={size}
            under={under}
          />
        )}
      </div>
      <div aria-hidden className="hidden h-full items-center justify-center pt-10 print:flex">
        <ShapeFigure
          drawing={revision.drawing}
          properties={revision.computed}
          label={label}
          fit={{ pxPerMm: PX_PER_MM_ON_PAPER / scale }}
        />
      </div>
    </section>
  );
}

const ACROSS: Partial<Record<RevisionRecord["state"], string>> = {
  draft: "",
  superseded: "superseded",
  withdrawn: "withdrawn",
};
