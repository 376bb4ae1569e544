import "server-only";
import type { RevisionRecord } from "@/lib/schemas/shape";
import type { Ctx } from "../context";
import { transition, type RevisionAddress } from "./transition";

/** Hands a draft to the checkers; from here on its geometry and figures never change. */
export const submitRevision = async ({
  ctx,
  ...address
}: { ctx: Ctx } & RevisionAddress): Promise<RevisionRecord> =>
  transition({
    ctx,
    address,
    verb: "revision.submit",
    from: ["draft"],
    wrongState: "Only a draft can be submitted",
    change: async () => ({
      revision: {
        state: "submitted",
        submittedAt: ctx.now,
        submittedBy: ctx.actor.userId,
        sentBackAt: null,
        sentBackBy: null,
        sentBackReason: "",
      },
    }),
  });
