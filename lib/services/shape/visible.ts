import "server-only";
import { and, eq, inArray, notInArray, or, sql, type SQL } from "drizzle-orm";
import { finder } from "@/db/schema/finder";
import { baysWith } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";

export type FinderState = "draft" | "submitted" | "released" | "withdrawn";

/** The finder rows of the asked states that this actor may see: work in progress only in bays where they may draft. */
export const visibleRows = (actor: Actor, states: readonly FinderState[]): SQL | undefined => {
  const settled = states.filter((state) => state === "released" || state === "withdrawn");
  const working = states.filter((state) => state === "draft" || state === "submitted");
  const { elsewhere, except, also } = baysWith(actor, "draft");
  const inBays = elsewhere
    ? except.length > 0
      ? notInArray(finder.bayId, except)
      : undefined
    : inArray(finder.bayId, also);
  const lanes = [
    settled.length > 0 ? stateIs(settled) : undefined,
    working.length > 0 ? and(stateIs(working), inBays) : undefined,
  ].filter((lane) => lane !== undefined);
  return and(eq(finder.organisationId, actor.organisationId), lanes.length > 0 ? or(...lanes) : sql`0`);
};

/** A single state is an equality, so that the search walks its index. */
const stateIs = (states: readonly FinderState[]): SQL => {
  const [only] = states;
  return states.length === 1 && only ? eq(finder.state, only) : inArray(finder.state, [...states]);
};
