import { ordinalOf, route } from "@/lib/http/route";
import { drawFigure } from "@/lib/services/shape/figure";

export const GET = route("shape.figure", {}, async ({ ctx, params, query }) => {
  const ordinal = query.revision === undefined ? undefined : ordinalOf(query, "revision");
  const svg = await drawFigure({ ctx, shapeId: params.id ?? "", ordinal });
  return new Response(svg, { headers: { "content-type": "image/svg+xml; charset=utf-8" } });
});
