import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { decideRightRequest } from "@/lib/services/right-request/decide";

export const PATCH = route(
  "rightRequest.decide",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const request = await decideRightRequest({ ctx, requestId: params.id ?? "", version, input: body });
    return json(request, { version: request.version });
  },
);
