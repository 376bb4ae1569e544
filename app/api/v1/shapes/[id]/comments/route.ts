import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createComment } from "@/lib/services/comment/create";
import { listComments } from "@/lib/services/comment/list";

export const GET = route("comment.list", {}, async ({ ctx, params }) =>
  json(await listComments({ ctx, shapeId: params.id ?? "" })),
);

export const POST = route("comment.create", { body: true }, async ({ ctx, params, body }) =>
  json(await createComment({ ctx, shapeId: params.id ?? "", input: body }), { status: 201 }),
);
