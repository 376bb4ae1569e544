import "server-only";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { AppError } from "@/lib/errors";
import { mayAtAll } from "@/lib/permissions";
import { type RevisionRecord, WithdrawRevisionInput } from "@/lib/schemas/shape";
import type { Ctx, VerbArgs } from "../context";
import { parseInput } from "../parse-input";
import { shapeOf } from "../shape/load-shape";
import { tellUsers } from "./tell-users";
import { transition, type RevisionAddress } from "./transition";

/** Takes a released revision out of use, with a reason and, where there is one, the shape to use instead. */
export const withdrawRevision = async ({
  ctx,
  input,
  ...address
}: VerbArgs<z.input<typeof WithdrawRevisionInput>, RevisionAddress>): Promise<RevisionRecord> => {
  mayAtAll(ctx.actor, "revision.withdraw");
  const { reason, replacementShapeId = null } = parseInput(WithdrawRevisionInput, input);
  return transition({
    ctx,
    address,
    verb: "revision.withdraw",
    from: ["released"],
    wrongState: "Only a released revision can be withdrawn",
    change: async (tx, shape, revision) => {
      await tellUsers(tx, ctx, shape, revision.ordinal, "withdrawn");
      const replacement = replacementShapeId && (await replacementOf(tx, ctx, shape.id, replacementShapeId));
      return {
        revision: {
          state: "withdrawn",
          withdrawnAt: ctx.now,
          withdrawnBy: ctx.actor.userId,
          withdrawnReason: reason,
          replacementShapeId: replacement,
        },
        after: { reason, replacementShapeId },
      };
    },
  });
};

const replacementOf = async (
  tx: Tx,
  { actor }: Ctx,
  shapeId: string,
  replacementId: string,
): Promise<string> => {
  const replacement = await shapeOf(tx, actor, replacementId);
  if (replacement.id === shapeId || replacement.releasedOrdinal === null) {
    throw new AppError("invalid", {
      user: "The replacement must be another shape that is released.",
      issues: [
        {
          code: "withdraw.replacement",
          detail: "Choose another, released shape.",
          pointer: "/replacementShapeId",
        },
      ],
    });
  }
  return replacement.id;
};
