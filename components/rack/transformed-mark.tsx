import { WarningSign } from "@/components/ui/signs";
import type { Drawing } from "@/lib/drawing/schema";

/** The material that the figures of a drawing are transformed for, where its parts differ in E; else null. */
function referenceOf(drawing: Drawing): string | null {
  const used = new Set(drawing.parts.flatMap((part) => (part.cutout ? [] : [part.material])));
  const moduli = new Set(drawing.materials.filter((m) => used.has(m.id)).map((m) => m.E));
  if (moduli.size < 2) return null;
  return drawing.materials.find((m) => m.id === drawing.reference)?.name ?? drawing.reference;
}

/** Marks a row whose A, I and S are transformed for one of its materials: they do not compare with those of a steel section. */
export function TransformedMark({ drawing }: { drawing: Drawing | undefined }) {
  const reference = drawing && referenceOf(drawing);
  if (!reference) return null;
  return (
    <span
      className="ml-1.5 text-note whitespace-nowrap text-chalk-ink"
      title={`A, I, S and r are transformed for ${reference}: count with its stress, and do not compare them with a section of another material`}
    >
      <WarningSign label="transformed figures" /> as {reference.split(",")[0]?.toLowerCase()}
    </span>
  );
}
