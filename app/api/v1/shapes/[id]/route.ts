import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { showShape } from "@/lib/services/shape/show";
import { updateShape } from "@/lib/services/shape/update";

export const GET = route("shape.show", {}, async ({ ctx, params, query }) => {
  const ordinal = query.revision === undefined ? undefined : ordinalOf(query, "revision");
  const shape = await showShape({ ctx, shapeId: params.id ?? "", ordinal });
  return json(shape, { version: shape.version });
});

export const PATCH = route(
  "shape.update",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const shape = await updateShape({
      ctx,
      shapeId: params.id ?? "",
      version,
      input: body,
    });
    return json(shape, { version: shape.version });
  },
);
