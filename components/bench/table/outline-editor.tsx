"use client";
import { useState } from "react";
import { useBenchActions } from "@/components/bench/bench-store";
import { QuantityField } from "@/components/display/quantity-field";
import { Button } from "@/components/ui/button";
import { RefusedSign } from "@/components/ui/signs";
import { Table, Td, Th } from "@/components/ui/table";
import { typedMm } from "@/lib/drawing/add-row";
import { reshapePart } from "@/lib/drawing/edit-parts";
import {
  chamferCorner,
  edgeRadius,
  filletCorner,
  insertVertex,
  moveVertex,
  removeVertex,
  setEdgeRadius,
  type Outline,
} from "@/lib/drawing/outline-edits";
import type { DrawingPart } from "@/lib/drawing/schema";
import type { Fault, Result } from "@/lib/result";

/** Every corner and edge of an outline to be typed: places, radii of edges, fillets and chamfers of corners. */
export const OutlineEditor = ({ part, item }: { part: DrawingPart; item: number }) => {
  const act = useBenchActions();
  const [refused, setRefused] = useState<string | null>(null);
  const [size, setSize] = useState(10);
  if (part.shape.kind !== "outline") return null;
  const outline = part.shape;
  const take = (next: Outline) => {
    setRefused(null);
    act.edit((d) => reshapePart(d, part.id, next));
  };
  const attempt = (next: Result<Outline, Fault>) =>
    next.ok ? take(next.value) : setRefused(next.error.detail);
  return (
    <div className="max-h-[60dvh] w-[520px] max-w-full overflow-auto">
      <div className="mb-2 flex items-center gap-2 text-table text-ink-2">
        Size of fillets and chamfers
        <QuantityField
          aria-label="Size of fillets and chamfers"
          value={size}
          onCommit={(mm) => setSize(mm ?? size)}
        />
      </div>
      <Table>
        <thead>
          <tr>
            <Th>Corner</Th>
            <Th numeric>x</Th>
            <Th numeric>y</Th>
            <Th numeric>Radius of next edge</Th>
            <Th>Corner is</Th>
          </tr>
        </thead>
        <tbody>
          {outline.outer.map((v, i) => (
            <tr key={i}>
              <Td>{i + 1}</Td>
              {(["x", "y"] as const).map((axis) => (
                <Td key={axis} className="px-1">
                  <QuantityField
                    bare
                    aria-label={`${axis} of corner ${i + 1}, item ${item}`}
                    value={v[axis]}
                    onCommit={(mm) =>
                      mm !== null && take(moveVertex(outline, i, { ...v, [axis]: typedMm(mm) }))
                    }
                    inputClassName="w-20"
                  />
                </Td>
              ))}
              <Td className="px-1 text-right">
                <QuantityField
                  bare
                  optional
                  placeholder="straight"
                  aria-label={`Radius of the edge after corner ${i + 1}, item ${item}`}
                  value={edgeRadius(outline, i)}
                  onCommit={(mm) => attempt(setEdgeRadius(outline, i, mm))}
                  inputClassName="w-20"
                />
              </Td>
              <Td className="px-1">
                <span className="flex gap-1">
                  <Button size="small" onClick={() => attempt(filletCorner(outline, i, size))}>
                    fillet
                  </Button>
                  <Button size="small" onClick={() => attempt(chamferCorner(outline, i, size))}>
                    chamfer
                  </Button>
                  <Button
                    size="small"
                    aria-label={`New corner after corner ${i + 1}`}
                    onClick={() => take(insertVertex(outline, i))}
                  >
                    add
                  </Button>
                  <Button
                    size="small"
                    disabled={outline.outer.length <= 3}
                    aria-label={`Remove corner ${i + 1}`}
                    onClick={() => take(removeVertex(outline, i))}
                  >
                    remove
                  </Button>
                </span>
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
      {refused && (
        <p role="alert" className="mt-2 flex gap-1.5 text-note text-oxide-ink">
          <RefusedSign className="mt-px" /> {refused}
        </p>
      )}
    </div>
  );
};
