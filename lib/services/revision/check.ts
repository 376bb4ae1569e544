import "server-only";
import type { z } from "zod";
import { mayAtAll } from "@/lib/permissions";
import { CheckRevisionInput, type RevisionRecord } from "@/lib/schemas/shape";
import type { VerbArgs } from "../context";
import { parseInput } from "../parse-input";
import { fourEyesOf, refuseOwnCheck } from "./four-eyes";
import { transition, type RevisionAddress } from "./transition";

/** Records who checked a submitted revision, when and how; with four eyes nobody who edited it. */
export const checkRevision = async ({
  ctx,
  input,
  ...address
}: VerbArgs<z.input<typeof CheckRevisionInput>, RevisionAddress>): Promise<RevisionRecord> => {
  mayAtAll(ctx.actor, "revision.check");
  const { how, note = "" } = parseInput(CheckRevisionInput, input);
  return transition({
    ctx,
    address,
    verb: "revision.check",
    from: ["submitted"],
    wrongState: "Only a submitted revision can be checked",
    change: async (tx, _shape, revision) => {
      refuseOwnCheck(revision, ctx.actor, await fourEyesOf(tx, ctx.actor));
      return {
        revision: { checkedAt: ctx.now, checkedBy: ctx.actor.userId, checkedHow: how, checkNote: note },
        after: { how, note },
      };
    },
  });
};
