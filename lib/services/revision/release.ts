import "server-only";
import { and, eq } from "drizzle-orm";
import { revisions } from "@/db/schema/revisions";
import type { RevisionRecord } from "@/lib/schemas/shape";
import type { Ctx } from "../context";
import { fourEyesOf, refuseUnchecked } from "./four-eyes";
import { tellUsers } from "./tell-users";
import { transition, type RevisionAddress } from "./transition";

/** Releases a submitted revision: everybody finds it, and what was released before is superseded. */
export const releaseRevision = async ({
  ctx,
  ...address
}: { ctx: Ctx } & RevisionAddress): Promise<RevisionRecord> =>
  transition({
    ctx,
    address,
    verb: "revision.release",
    from: ["submitted"],
    wrongState: "Only a submitted revision can be released",
    change: async (tx, shape, revision) => {
      refuseUnchecked(revision, await fourEyesOf(tx, ctx.actor));
      await tx
        .update(revisions)
        .set({ state: "superseded", supersededAt: ctx.now, updatedAt: ctx.now })
        .where(
          and(
            eq(revisions.shapeId, shape.id),
            eq(revisions.organisationId, ctx.actor.organisationId),
            eq(revisions.state, "released"),
          ),
        );
      if (shape.releasedOrdinal !== null)
        await tellUsers(tx, ctx, shape, shape.releasedOrdinal, "superseded");
      return {
        revision: { state: "released", releasedAt: ctx.now, releasedBy: ctx.actor.userId },
        shape: { releasedOrdinal: revision.ordinal, workingOrdinal: null },
        after: { superseded: shape.releasedOrdinal },
      };
    },
  });
