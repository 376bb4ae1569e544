import "server-only";
import { closeSession as closeByToken } from "@/lib/auth/sessions";
import type { OpenCtx } from "../context";

/** Signs out: the session is gone at once. Without one there is nothing to do. */
export const closeSession = async ({ ctx, token }: { ctx: OpenCtx; token: string | null }): Promise<void> => {
  if (token !== null) await closeByToken(ctx.db, token);
};
