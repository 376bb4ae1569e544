import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { checkRevision } from "@/lib/services/revision/check";

export const POST = route(
  "revision.check",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const address = { shapeId: params.id ?? "", ordinal: ordinalOf(params, "n"), version };
    const revision = await checkRevision({ ctx, ...address, input: body });
    return json(revision, { version: revision.version });
  },
);
