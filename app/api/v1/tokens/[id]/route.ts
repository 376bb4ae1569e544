import { noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { revokeToken } from "@/lib/services/token/revoke";

export const DELETE = route("token.revoke", {}, async ({ ctx, params }) => {
  await revokeToken({ ctx, tokenId: params.id ?? "" });
  return noContent();
});
