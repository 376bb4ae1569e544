import "server-only";
import { headers } from "next/headers";
import { redirect } from "next/navigation";
import { cache } from "react";
import { database } from "@/db/client";
import { authenticate } from "@/lib/auth/authenticate";
import type { Ctx, OpenCtx } from "@/lib/services/context";
import { newId } from "@/lib/services/new-id";

/** Context of the person a page is for; null when nobody is signed in. Read once for each request. */
export const pageContextOrNull = cache(async (): Promise<Ctx | null> => {
  const now = Date.now();
  const db = await database();
  const who = await authenticate(db, await headers(), now);
  return who && { actor: who.actor, db, now, requestId: newId() };
});

/** First line of every page of the desk: the actor, or the way to the sign-in page and back to `path`. */
export const pageContext = async (path: string): Promise<Ctx> => {
  const ctx = await pageContextOrNull();
  if (ctx === null) redirect(`/sign-in?next=${encodeURIComponent(path)}`);
  return ctx;
};

/** Context of a page that anyone may open, such as the one a letter links to. */
export const openPageContext = async (): Promise<OpenCtx> => ({
  db: await database(),
  now: Date.now(),
  requestId: newId(),
});
