import "server-only";
import type { z } from "zod";
import { tokens } from "@/db/schema/tokens";
import { LIMITS, requireTry } from "@/lib/auth/limits";
import { hashSecret, newSecret } from "@/lib/auth/secret";
import { mayAtAll } from "@/lib/permissions";
import { type CreatedToken, CreateTokenInput } from "@/lib/schemas/token";
import { AppError } from "@/lib/errors";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { tokensOf } from "./list";

const DAY_MS = 86_400_000;

/** Makes a token of one's own; it is answered once and stored as a hash. A token cannot make tokens. */
export const createToken = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateTokenInput>>): Promise<CreatedToken> => {
  mayAtAll(ctx.actor, "token.create");
  if (ctx.actor.via === "token")
    throw new AppError("forbidden", { user: "A token cannot make tokens: sign in." });
  const { name, may, days } = parseInput(CreateTokenInput, input);
  await requireTry(ctx.db, [`token:${ctx.actor.membershipId}`], LIMITS.token, ctx.now);
  const token = newSecret();
  return ctx.db.write(async (tx) => {
    const id = newId();
    const expiresAt = ctx.now + days * DAY_MS;
    await tx.insert(tokens).values({
      id,
      organisationId: ctx.actor.organisationId,
      membershipId: ctx.actor.membershipId,
      name,
      hash: hashSecret(token),
      may,
      expiresAt,
      createdAt: ctx.now,
    });
    await logDeed(tx, ctx, {
      verb: "token.create",
      entity: "token",
      entityId: id,
      subject: name,
      after: { name, may, expiresAt },
    });
    return { ...found((await tokensOf(tx, ctx)).find((row) => row.id === id)), token };
  });
};
