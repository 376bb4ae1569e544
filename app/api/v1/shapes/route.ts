import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createShape } from "@/lib/services/shape/create";
import { findShapes } from "@/lib/services/shape/find";

export const GET = route("shape.find", {}, async ({ ctx, query }) =>
  json(await findShapes({ ctx, input: query })),
);

export const POST = route("shape.create", { body: true }, async ({ ctx, body }) => {
  const shape = await createShape({ ctx, input: body });
  return json(shape, {
    status: 201,
    version: shape.version,
    headers: { location: `/api/v1/shapes/${shape.id}` },
  });
});
