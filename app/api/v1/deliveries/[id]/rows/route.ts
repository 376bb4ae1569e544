import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { findDeliveryRows } from "@/lib/services/delivery/rows";

export const GET = route("delivery.rows", {}, async ({ ctx, params, query }) =>
  json(await findDeliveryRows({ ctx, deliveryId: params.id ?? "", input: query })),
);
