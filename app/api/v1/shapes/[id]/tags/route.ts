import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { putTags } from "@/lib/services/tag/put";

/** If-Match carries the shape's ETag. */
export const PUT = route(
  "shape.tag",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const shape = await putTags({ ctx, shapeId: params.id ?? "", version, input: body });
    return json(shape, { version: shape.version });
  },
);
