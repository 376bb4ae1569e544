import "server-only";
import { eq, max } from "drizzle-orm";
import type { z } from "zod";
import { deliveries } from "@/db/schema/deliveries";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { CreateDeliveryInput, type Delivery } from "@/lib/schemas/delivery";
import { bayOf } from "../bay/load-bay";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";
import { deliveryView } from "./delivery-view";
import { EMPTY_LAYOUT, layoutJson } from "./layout";
import { codeOf, deliveryOf } from "./load-delivery";

/** Announces a delivery for a bay; its file comes next. */
export const createDelivery = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateDeliveryInput>>): Promise<Delivery> => {
  mayAtAll(ctx.actor, "delivery.create");
  const { bayId, fileName } = parseInput(CreateDeliveryInput, input);
  const { organisationId, userId } = ctx.actor;
  return ctx.db.write(async (tx) => {
    const bay = await bayOf(tx, ctx.actor, bayId);
    requireRight(ctx.actor, "revision.release", bay.id);
    const [last] = await tx
      .select({ number: max(deliveries.number) })
      .from(deliveries)
      .where(eq(deliveries.organisationId, organisationId));
    const id = newId();
    const number = (last?.number ?? 0) + 1;
    await tx.insert(deliveries).values({
      id,
      organisationId,
      bayId: bay.id,
      number,
      fileName,
      state: "announced",
      layout: layoutJson(EMPTY_LAYOUT),
      createdBy: userId,
      createdAt: ctx.now,
      updatedAt: ctx.now,
    });
    await logDeed(tx, ctx, {
      verb: "delivery.create",
      entity: "delivery",
      entityId: id,
      subject: `${codeOf(number)} ${fileName}`,
      after: { bay: bay.name, fileName },
    });
    return deliveryView(tx, await deliveryOf(tx, ctx.actor, id));
  });
};
