import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createDelivery } from "@/lib/services/delivery/create";
import { listDeliveries } from "@/lib/services/delivery/list";

export const GET = route("delivery.list", {}, async ({ ctx, query }) =>
  json(await listDeliveries({ ctx, input: query })),
);

export const POST = route("delivery.create", { body: true }, async ({ ctx, body }) => {
  const delivery = await createDelivery({ ctx, input: body });
  return json(delivery, { status: 201, version: delivery.version });
});
