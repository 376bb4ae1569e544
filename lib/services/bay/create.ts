import "server-only";
import { eq, max } from "drizzle-orm";
import type { z } from "zod";
import { uniqueViolation } from "@/db/retry";
import { bays } from "@/db/schema/bays";
import { AppError } from "@/lib/errors";
import { mayAtAll, rightIn } from "@/lib/permissions";
import { type Bay, CreateBayInput } from "@/lib/schemas/bay";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";

/** A name that is taken in the organisation, ignoring case, is a conflict that names the field. */
export const refuseTakenName = (error: unknown): never => {
  if (uniqueViolation(error) === null) throw error;
  throw new AppError("conflict", {
    user: "There is a bay of that name already.",
    issues: [{ code: "bay.nameTaken", detail: "There is a bay of that name already.", pointer: "/name" }],
    cause: error,
  });
};

/** Adds a bay at the end of the strip. */
export const createBay = async ({ ctx, input }: VerbArgs<z.input<typeof CreateBayInput>>): Promise<Bay> => {
  mayAtAll(ctx.actor, "bay.create");
  const { name, counts = "computed", tolerance = 0.01 } = parseInput(CreateBayInput, input);
  const { organisationId } = ctx.actor;
  const id = newId();
  return ctx.db
    .write(async (tx) => {
      const [last] = await tx
        .select({ ordinal: max(bays.ordinal) })
        .from(bays)
        .where(eq(bays.organisationId, organisationId));
      const made = { id, name, counts, tolerance, ordinal: (last?.ordinal ?? 0) + 1 };
      await tx.insert(bays).values({ ...made, organisationId, createdAt: ctx.now });
      await logDeed(tx, ctx, { verb: "bay.create", entity: "bay", entityId: id, subject: name, after: made });
      return { ...made, shapes: 0, right: rightIn(ctx.actor, id), version: 1 };
    })
    .catch(refuseTakenName);
};
