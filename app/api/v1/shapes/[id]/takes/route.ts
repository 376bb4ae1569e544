import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createTake } from "@/lib/services/take/create";
import { listTakes } from "@/lib/services/take/list";

export const GET = route("take.list", {}, async ({ ctx, params }) =>
  json(await listTakes({ ctx, shapeId: params.id ?? "" })),
);

export const POST = route("take.create", { body: true }, async ({ ctx, params, body }) =>
  json(await createTake({ ctx, shapeId: params.id ?? "", input: body }), { status: 201 }),
);
