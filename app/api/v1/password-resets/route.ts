import { clientAddress } from "@/lib/http/origin";
import { noContent } from "@/lib/http/answer";
import { openRoute } from "@/lib/http/route";
import { requestReset } from "@/lib/services/password-reset/request";

export const POST = openRoute("passwordReset.request", { body: true }, async ({ ctx, body, request }) => {
  await requestReset({ ctx, input: body, address: clientAddress(request) });
  return noContent({ status: 202 });
});
