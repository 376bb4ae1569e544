import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createRightRequest } from "@/lib/services/right-request/create";
import { listRightRequests } from "@/lib/services/right-request/list";

export const GET = route("rightRequest.list", {}, async ({ ctx }) => json(await listRightRequests({ ctx })));

export const POST = route("rightRequest.create", { body: true }, async ({ ctx, body }) => {
  const request = await createRightRequest({ ctx, input: body });
  return json(request, { status: 201, version: request.version });
});
