import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { decideRow } from "@/lib/services/delivery/decide";
import { showDeliveryRow } from "@/lib/services/delivery/rows";

export const GET = route("delivery.rows", {}, async ({ ctx, params }) => {
  const row = await showDeliveryRow({ ctx, deliveryId: params.id ?? "", row: ordinalOf(params, "n") });
  return json(row, { version: row.version });
});

export const PATCH = route(
  "delivery.decide",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const decided = await decideRow({
      ctx,
      deliveryId: params.id ?? "",
      row: ordinalOf(params, "n"),
      version,
      input: body,
    });
    return json(decided, { version: decided.row.version });
  },
);
