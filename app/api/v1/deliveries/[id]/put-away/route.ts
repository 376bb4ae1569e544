import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { putAway } from "@/lib/services/delivery/put-away";

export const POST = route(
  "delivery.putAway",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const delivery = await putAway({ ctx, deliveryId: params.id ?? "", version, input: body });
    // Still at it after a few seconds: accepted, and to be asked for.
    const status = delivery.state === "putting-away" ? 202 : 200;
    return json(delivery, { status, version: delivery.version });
  },
);
