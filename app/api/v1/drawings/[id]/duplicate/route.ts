import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { duplicateDrawing } from "@/lib/services/drawing/duplicate";

export const POST = route("drawing.duplicate", {}, async ({ ctx, params }) => {
  const drawing = await duplicateDrawing({ ctx, drawingId: params.id ?? "" });
  return json(drawing, { status: 201, version: drawing.version });
});
