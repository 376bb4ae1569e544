import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createToken } from "@/lib/services/token/create";
import { listTokens } from "@/lib/services/token/list";

export const GET = route("token.list", {}, async ({ ctx }) => json(await listTokens({ ctx })));

export const POST = route("token.create", { body: true }, async ({ ctx, body }) =>
  json(await createToken({ ctx, input: body }), { status: 201 }),
);
