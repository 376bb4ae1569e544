import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { putReading } from "@/lib/services/delivery/put-reading";

export const PUT = route(
  "delivery.putReading",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const delivery = await putReading({ ctx, deliveryId: params.id ?? "", version, input: body });
    return json(delivery, { version: delivery.version });
  },
);
