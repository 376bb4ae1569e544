import "server-only";
import type { Db } from "@/db/client";
import type { Actor } from "@/lib/schemas/access";

/** What every verb gets: who acts, the database, the time, and the request it answers. */
export type Ctx = Readonly<{ actor: Actor; db: Db; now: number; requestId: string }>;

/** Verbs that anyone may call (sign in, accept an invitation) have no actor. */
export type OpenCtx = Omit<Ctx, "actor">;

declare const unparsed: unique symbol;
/** What came in a body and no schema has seen yet: all a verb can do with it is parse it. */
export type Unparsed = Readonly<{ [unparsed]: true }>;

/** One verb, one signature: the context, the input to be parsed, and the ids and version of the thing it is about. */
export type VerbArgs<Input, Address extends object = object> = Readonly<{
  ctx: Ctx;
  input: Input | Unparsed;
}> &
  Readonly<Address>;

/** What a change must name: the version it was made from (If-Match). */
export type Versioned = Readonly<{ version: number }>;
