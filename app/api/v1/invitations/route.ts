import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createInvitation } from "@/lib/services/invitation/create";
import { listInvitations } from "@/lib/services/invitation/list";

export const GET = route("invitation.list", {}, async ({ ctx }) => json(await listInvitations({ ctx })));

export const POST = route("invitation.create", { body: true }, async ({ ctx, body }) =>
  json(await createInvitation({ ctx, input: body }), { status: 201 }),
);
