import "server-only";
import { mayAtAll } from "@/lib/permissions";
import type { RightList } from "@/lib/schemas/member";
import type { Ctx } from "../context";
import { grantsOf } from "./grants";

export const listRights = async ({ ctx }: { ctx: Ctx }): Promise<RightList> => {
  mayAtAll(ctx.actor, "right.list");
  return { items: await grantsOf(ctx.db.read, ctx) };
};
