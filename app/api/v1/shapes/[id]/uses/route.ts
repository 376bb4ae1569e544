import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { listShapeUses } from "@/lib/services/shape/uses";

export const GET = route("shape.uses", {}, async ({ ctx, params }) =>
  json(await listShapeUses({ ctx, shapeId: params.id ?? "" })),
);
