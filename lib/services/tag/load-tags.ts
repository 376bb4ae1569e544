import "server-only";
import { and, asc, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { tags } from "@/db/schema/tags";
import type { Actor } from "@/lib/schemas/access";

export const tagKeyOf = (tag: string): string => tag.normalize("NFC").trim().toLocaleLowerCase("en");

export const tagsOf = async (
  read: Pick<Reader | Tx, "select">,
  actor: Actor,
  shapeId: string,
): Promise<string[]> => {
  const rows = await read
    .select({ tag: tags.tag })
    .from(tags)
    .where(and(eq(tags.shapeId, shapeId), eq(tags.organisationId, actor.organisationId)))
    .orderBy(asc(tags.tagKey));
  return rows.map((row) => row.tag);
};
