import "server-only";
import { and, eq, inArray } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { shapes } from "@/db/schema/shapes";
import type { Person } from "@/lib/schemas/common";
import type { RevisionItem } from "@/lib/schemas/shape";
import type { Actor } from "@/lib/schemas/access";
import { iso, isoOrNull } from "../moments";
import { peopleOf } from "../people";
import { letterOf } from "../shape/letter";
import type { LoadedRevision } from "../shape/load-shape";

export const editorsOf = (revision: Pick<LoadedRevision, "editors">): readonly string[] =>
  JSON.parse(revision.editors) as string[];

const deed = (person: (id: string | null) => Person, by: string | null, at: number | null) =>
  at === null ? null : { by: person(by), at: iso(at) };

/** Revisions in short, with the names of the people in them. */
export const describeRevisions = async (
  read: Pick<Reader | Tx, "select">,
  actor: Actor,
  rows: readonly Omit<LoadedRevision, "drawing">[],
): Promise<RevisionItem[]> => {
  const person = await peopleOf(
    read,
    rows.flatMap((row) => [
      row.authorId,
      ...editorsOf(row),
      row.submittedBy,
      row.checkedBy,
      row.sentBackBy,
      row.releasedBy,
      row.withdrawnBy,
    ]),
  );
  const replacements = rows.flatMap((row) => row.replacementShapeId ?? []);
  const named =
    replacements.length === 0
      ? []
      : await read
          .select({ id: shapes.id, designation: shapes.designation })
          .from(shapes)
          .where(and(eq(shapes.organisationId, actor.organisationId), inArray(shapes.id, replacements)));
  return rows.map((row) => {
    const checked = deed(person, row.checkedBy, row.checkedAt);
    const sentBack = deed(person, row.sentBackBy, row.sentBackAt);
    const withdrawn = deed(person, row.withdrawnBy, row.withdrawnAt);
    return {
      ordinal: row.ordinal,
      letter: letterOf(row.ordinal),
      state: row.state,
      note: row.note,
      author: person(row.authorId),
      editors: editorsOf(row).map(person),
      submitted: deed(person, row.submittedBy, row.submittedAt),
      checked: checked && { ...checked, how: row.checkedHow ?? "review", note: row.checkNote },
      sentBack: sentBack && { ...sentBack, reason: row.sentBackReason },
      released: deed(person, row.releasedBy, row.releasedAt),
      supersededAt: isoOrNull(row.supersededAt),
      withdrawn: withdrawn && {
        ...withdrawn,
        reason: row.withdrawnReason,
        replacement: named.find((shape) => shape.id === row.replacementShapeId) ?? null,
      },
      deliveryId: row.deliveryId,
      contentHash: row.contentHash,
      createdAt: iso(row.createdAt),
      updatedAt: iso(row.updatedAt),
      version: row.version,
    };
  });
};
