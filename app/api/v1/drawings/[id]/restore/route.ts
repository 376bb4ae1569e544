import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { restoreDrawing } from "@/lib/services/drawing/restore";

export const POST = route("drawing.restore", {}, async ({ ctx, params }) => {
  const drawing = await restoreDrawing({ ctx, drawingId: params.id ?? "" });
  return json(drawing, { status: 200, version: drawing.version });
});
