import { json, noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { deleteDelivery } from "@/lib/services/delivery/delete";
import { showDelivery } from "@/lib/services/delivery/show";

export const GET = route("delivery.show", {}, async ({ ctx, params }) => {
  const delivery = await showDelivery({ ctx, deliveryId: params.id ?? "" });
  return json(delivery, { version: delivery.version });
});

export const DELETE = route("delivery.delete", { version: true }, async ({ ctx, params, version }) => {
  await deleteDelivery({ ctx, deliveryId: params.id ?? "", version });
  return noContent();
});
