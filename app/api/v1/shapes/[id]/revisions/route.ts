import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createRevision } from "@/lib/services/revision/create";
import { listRevisions } from "@/lib/services/revision/list";

export const GET = route("revision.list", {}, async ({ ctx, params }) =>
  json(await listRevisions({ ctx, shapeId: params.id ?? "" })),
);

/** If-Match carries the shape's ETag. */
export const POST = route(
  "revision.create",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const revision = await createRevision({ ctx, shapeId: params.id ?? "", version, input: body });
    return json(revision, { status: 201, version: revision.version });
  },
);
