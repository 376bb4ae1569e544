import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { computeDrawingProperties } from "@/lib/services/properties/compute";

export const POST = route("properties.compute", { body: true }, async ({ ctx, body, request }) =>
  json(await computeDrawingProperties({ ctx, input: body, signal: request.signal })),
);
