import "server-only";
import { and, eq, isNull, or } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { drawingUses } from "@/db/schema/drawing-uses";
import { drawings } from "@/db/schema/drawings";
import { revisions } from "@/db/schema/revisions";
import { shapes } from "@/db/schema/shapes";
import { users } from "@/db/schema/users";
import type { Actor } from "@/lib/schemas/access";
import { letterOf } from "./letter";

export type BuiltOnIt = Readonly<{
  kind: "drawing" | "revision";
  /** Id of the drawing, or of the shape the revision belongs to. */
  id: string;
  bayId: string | null;
  name: string;
  ordinal: number;
  author: Readonly<{ id: string; name: string; email: string }>;
}>;

/** What is built on a shape: private drawings, and revisions that are not superseded or withdrawn themselves. */
export const usersOfShape = async (
  read: Pick<Reader | Tx, "select">,
  actor: Actor,
  shapeId: string,
): Promise<BuiltOnIt[]> => {
  const author = { id: users.id, name: users.name, email: users.email };
  const of = and(eq(drawingUses.organisationId, actor.organisationId), eq(drawingUses.shapeId, shapeId));
  const drawn = await read
    .select({ id: drawings.id, name: drawings.name, ordinal: drawingUses.ordinal, author })
    .from(drawingUses)
    .innerJoin(drawings, and(eq(drawings.id, drawingUses.userOf), isNull(drawings.deletedAt)))
    .innerJoin(users, eq(users.id, drawings.ownerId))
    .where(of);
  const revised = await read
    .select({
      id: shapes.id,
      bayId: shapes.bayId,
      designation: shapes.designation,
      letter: revisions.ordinal,
      ordinal: drawingUses.ordinal,
      author,
    })
    .from(drawingUses)
    .innerJoin(revisions, eq(revisions.id, drawingUses.userOf))
    .innerJoin(
      shapes,
      and(
        eq(shapes.id, revisions.shapeId),
        or(eq(shapes.releasedOrdinal, revisions.ordinal), eq(shapes.workingOrdinal, revisions.ordinal)),
      ),
    )
    .innerJoin(users, eq(users.id, revisions.authorId))
    .where(of);
  return [
    ...drawn.map((row) => ({ ...row, kind: "drawing" as const, bayId: null })),
    ...revised.map(({ designation, letter, ...row }) => ({
      ...row,
      kind: "revision" as const,
      name: `${designation} ${letterOf(letter)}`,
    })),
  ];
};
