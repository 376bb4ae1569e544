import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { sendBackRevision } from "@/lib/services/revision/send-back";

export const POST = route(
  "revision.sendBack",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const address = { shapeId: params.id ?? "", ordinal: ordinalOf(params, "n"), version };
    const revision = await sendBackRevision({ ctx, ...address, input: body });
    return json(revision, { version: revision.version });
  },
);
