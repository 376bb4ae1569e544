import type { ShapeLink } from "@/components/bench/bench-store";
import type { RevisionRecord, ShapeSheet } from "@/lib/schemas/shape";

const revisionOf = (r: RevisionRecord): ShapeLink["revision"] => ({
  ordinal: r.ordinal,
  letter: r.letter,
  state: r.state,
  version: r.version,
  checked: r.checked,
  may: r.may,
  properties: r.computed,
});

/** What the Bench keeps of the shape a sheet belongs to. */
export const shapeLinkOf = (sheet: ShapeSheet): ShapeLink => ({
  id: sheet.id,
  designation: sheet.designation,
  title: sheet.title,
  bayId: sheet.bay.id,
  bayName: sheet.bay.name,
  version: sheet.version,
  revision: revisionOf(sheet.revision),
  drawing: sheet.revision.drawing,
});

export const withRevision = (link: ShapeLink, r: RevisionRecord): ShapeLink => ({
  ...link,
  revision: revisionOf(r),
  drawing: r.drawing,
});
