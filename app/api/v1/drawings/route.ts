import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createDrawing } from "@/lib/services/drawing/create";
import { listDrawings } from "@/lib/services/drawing/list";

export const GET = route("drawing.list", {}, async ({ ctx, query }) =>
  json(await listDrawings({ ctx, input: query })),
);

export const POST = route("drawing.create", { body: true }, async ({ ctx, body }) => {
  const drawing = await createDrawing({ ctx, input: body });
  return json(drawing, {
    status: 201,
    version: drawing.version,
    headers: { location: `/api/v1/drawings/${drawing.id}` },
  });
});
