import { json, noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { deleteDrawing } from "@/lib/services/drawing/delete";
import { showDrawing } from "@/lib/services/drawing/show";
import { updateDrawing } from "@/lib/services/drawing/update";

export const GET = route("drawing.show", {}, async ({ ctx, params }) => {
  const drawing = await showDrawing({ ctx, drawingId: params.id ?? "" });
  return json(drawing, { version: drawing.version });
});

export const PATCH = route(
  "drawing.update",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const drawing = await updateDrawing({
      ctx,
      drawingId: params.id ?? "",
      version,
      input: body,
    });
    return json(drawing, { version: drawing.version });
  },
);

export const DELETE = route("drawing.delete", { version: true }, async ({ ctx, params, version }) => {
  await deleteDrawing({ ctx, drawingId: params.id ?? "", version });
  return noContent();
});
