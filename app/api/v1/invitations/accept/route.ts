import { json } from "@/lib/http/answer";
import { openRoute } from "@/lib/http/route";
import { acceptInvitation } from "@/lib/services/invitation/accept";

export const POST = openRoute("invitation.accept", { body: true }, async ({ ctx, body }) =>
  json(await acceptInvitation({ ctx, input: body }), { status: 201 }),
);
