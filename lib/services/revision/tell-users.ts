import "server-only";
import type { Tx } from "@/db/client";
import { enqueueLetter } from "@/lib/mail/enqueue";
import { outdatedLetter } from "@/lib/mail/letters";
import type { Ctx } from "../context";
import { usersOfShape } from "../shape/users-of";
import type { LoadedShape } from "../shape/load-shape";
import { subjectOf } from "./transition";

/** Tells the authors of what is built on a revision that it is superseded or withdrawn: one letter to each, naming their own things. */
export const tellUsers = async (
  tx: Tx,
  ctx: Ctx,
  shape: LoadedShape,
  ordinal: number,
  what: "superseded" | "withdrawn",
): Promise<void> => {
  const built = (await usersOfShape(tx, ctx.actor, shape.id)).filter((user) => user.ordinal === ordinal);
  const { organisationId } = ctx.actor;
  for (const email of new Set(built.map((user) => user.author.email))) {
    const names = [...new Set(built.filter((user) => user.author.email === email).map((user) => user.name))];
    const words = outdatedLetter({
      subject: subjectOf(shape, ordinal),
      what,
      names,
      by: ctx.actor.name,
      shapeId: shape.id,
    });
    await enqueueLetter(tx, { organisationId, to: email, ...words }, ctx.now);
  }
};
