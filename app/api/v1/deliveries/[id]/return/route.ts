import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { returnDelivery } from "@/lib/services/delivery/return";

export const POST = route(
  "delivery.return",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const delivery = await returnDelivery({ ctx, deliveryId: params.id ?? "", version, input: body });
    return json(delivery, { version: delivery.version });
  },
);
