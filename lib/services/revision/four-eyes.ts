import "server-only";
import { eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { organisations } from "@/db/schema/organisations";
import { AppError } from "@/lib/errors";
import type { Actor } from "@/lib/schemas/access";
import type { LoadedRevision } from "../shape/load-shape";
import { editorsOf } from "./describe";

/** Whether this organisation asks for a second pair of eyes. */
export const fourEyesOf = async (read: Pick<Reader | Tx, "select">, actor: Actor): Promise<boolean> => {
  const [row] = await read
    .select({ fourEyes: organisations.fourEyes })
    .from(organisations)
    .where(eq(organisations.id, actor.organisationId));
  return row?.fourEyes ?? true;
};

export const edited = (revision: LoadedRevision, userId: string): boolean =>
  editorsOf(revision).includes(userId);

/** A check by somebody who edited none of the revision. */
export const isCheckedByAnother = (revision: LoadedRevision): boolean =>
  revision.checkedBy !== null && !edited(revision, revision.checkedBy);

export const refuseOwnCheck = (revision: LoadedRevision, actor: Actor, fourEyes: boolean): void => {
  if (!fourEyes || !edited(revision, actor.userId)) return;
  throw new AppError("forbidden", { user: "You edited this revision: somebody who did not must check it." });
};

export const refuseUnchecked = (revision: LoadedRevision, fourEyes: boolean): void => {
  if (!fourEyes || isCheckedByAnother(revision)) return;
  throw new AppError("conflict", {
    user: "This revision has not been checked by somebody who edited none of it: have it checked, then release it.",
  });
};
