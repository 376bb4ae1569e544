import { noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { changePassword } from "@/lib/services/me/change-password";

export const PUT = route("me.changePassword", { body: true }, async ({ ctx, body, sessionId }) => {
  await changePassword({ ctx, sessionId, input: body });
  return noContent();
});
