import "server-only";
import type { z } from "zod";
import { mayAtAll } from "@/lib/permissions";
import { type RevisionRecord, SendBackRevisionInput } from "@/lib/schemas/shape";
import type { VerbArgs } from "../context";
import { parseInput } from "../parse-input";
import { transition, type RevisionAddress } from "./transition";

/** Gives a submitted revision back to its author as a draft, with the reason; a check made before no longer counts. */
export const sendBackRevision = async ({
  ctx,
  input,
  ...address
}: VerbArgs<z.input<typeof SendBackRevisionInput>, RevisionAddress>): Promise<RevisionRecord> => {
  mayAtAll(ctx.actor, "revision.sendBack");
  const { reason } = parseInput(SendBackRevisionInput, input);
  return transition({
    ctx,
    address,
    verb: "revision.sendBack",
    from: ["submitted"],
    wrongState: "Only a submitted revision can be sent back",
    change: async () => ({
      revision: {
        state: "draft",
        sentBackAt: ctx.now,
        sentBackBy: ctx.actor.userId,
        sentBackReason: reason,
        checkedAt: null,
        checkedBy: null,
        checkedHow: null,
        checkNote: "",
      },
      after: { reason },
    }),
  });
};
