import "server-only";
import { mayAtAll } from "@/lib/permissions";
import type { ShapeUses } from "@/lib/schemas/shape";
import type { Ctx } from "../context";
import { seesWork, shapeOf } from "./load-shape";
import { usersOfShape } from "./users-of";

/** What is built on a shape: one's own private drawings, nobody else's, and revisions in bays whose work one sees. */
export const listShapeUses = async ({ ctx, shapeId }: { ctx: Ctx; shapeId: string }): Promise<ShapeUses> => {
  mayAtAll(ctx.actor, "shape.uses");
  const shape = await shapeOf(ctx.db.read, ctx.actor, shapeId);
  const built = await usersOfShape(ctx.db.read, ctx.actor, shape.id);
  return {
    items: built
      .filter((user) =>
        user.bayId === null ? user.author.id === ctx.actor.userId : seesWork(ctx.actor, user.bayId),
      )
      .map(({ kind, id, name, ordinal, author }) => ({
        kind,
        id,
        name,
        ordinal,
        author: { id: author.id, name: author.name },
      })),
  };
};
