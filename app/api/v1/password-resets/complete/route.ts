import { noContent } from "@/lib/http/answer";
import { openRoute } from "@/lib/http/route";
import { completeReset } from "@/lib/services/password-reset/complete";

export const POST = openRoute("passwordReset.complete", { body: true }, async ({ ctx, body }) => {
  await completeReset({ ctx, input: body });
  return noContent();
});
