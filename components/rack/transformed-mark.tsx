import { WarningSign } from "@/components/ui/signs";
import type { Drawing } from "@/lib/drawing/schema";
import { transformedFor } from "@/lib/drawing/transformed-for";

/** Marks a row whose A, I and S are transformed for one of its materials: they do not compare with those of a steel section. */
export function TransformedMark({ drawing }: { drawing: Drawing | undefined }) {
  const reference = drawing && transformedFor(drawing);
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
