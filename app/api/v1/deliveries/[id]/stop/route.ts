import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { stopDelivery } from "@/lib/services/delivery/stop";

export const POST = route("delivery.stop", {}, async ({ ctx, params }) => {
  const delivery = await stopDelivery({ ctx, deliveryId: params.id ?? "" });
  return json(delivery, { version: delivery.version });
});
