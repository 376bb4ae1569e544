import { json } from "@/lib/http/answer";
import { openRoute } from "@/lib/http/route";
import { showInvitation } from "@/lib/services/invitation/show";

/** Asked with the secret in the body, so that it stands in no log; it changes nothing. */
export const POST = openRoute("invitation.show", { body: true }, async ({ ctx, body }) =>
  json(await showInvitation({ ctx, input: body })),
);
