import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { listShapeDeeds } from "@/lib/services/shape/deeds";

export const GET = route("shape.deeds", {}, async ({ ctx, params }) =>
  json(await listShapeDeeds({ ctx, shapeId: params.id ?? "" })),
);
