import { noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { revokeInvitation } from "@/lib/services/invitation/revoke";

export const DELETE = route("invitation.revoke", {}, async ({ ctx, params }) => {
  await revokeInvitation({ ctx, invitationId: params.id ?? "" });
  return noContent();
});
