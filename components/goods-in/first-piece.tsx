"use client";
import dynamic from "next/dynamic";
import { ComparisonTable } from "@/components/goods-in/comparison-table";
import { PaneHead } from "@/components/ui/table";
import { AwaitedLine } from "@/components/ui/waiting";
import { useRow } from "@/lib/client/deliveries";
import type { FigureShow } from "@/lib/figure/compose-figure";

// The figure brings geometry and the clipper with it: late, so that the table stands first.
const ShapeFigure = dynamic(() => import("@/components/rack/shape-figure"), { ssr: false });
const SHOW: FigureShow = { dimensions: true, axes: true, balloons: false, centroidDimension: false };

/** Row 1 drawn and computed by the matching at hand, so that a wrong column shows at once. */
export function FirstPiece({ deliveryId }: Readonly<{ deliveryId: string }>) {
  const row = useRow(deliveryId, 1);
  const detail = row.data;
  return (
    <section aria-label="First piece">
      <PaneHead>
        First piece <span className="text-note font-regular text-ink-3">row 1, read as matched at left</span>
      </PaneHead>
      {detail === undefined ? (
        <div className="p-3">{row.isPending && <AwaitedLine>computing the first row</AwaitedLine>}</div>
      ) : (
        <>
          {detail.drawing !== null && (
            <div className="flex justify-center border-b border-rule">
              <ShapeFigure
                drawing={detail.drawing}
                properties={detail.properties}
                fit={{ width: 356, height: 250 }}
                show={SHOW}
                label={`Section of ${detail.designation}, row 1`}
              />
            </div>
          )}
          <ComparisonTable row={detail} gauge={false} />
          {detail.reasons.map((reason, i) => (
            <p key={i} className="px-3 py-1 text-note text-oxide-ink">
              {reason.detail}
            </p>
          ))}
        </>
      )}
    </section>
  );
}
