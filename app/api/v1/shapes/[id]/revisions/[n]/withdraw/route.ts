import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { withdrawRevision } from "@/lib/services/revision/withdraw";

export const POST = route(
  "revision.withdraw",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const address = { shapeId: params.id ?? "", ordinal: ordinalOf(params, "n"), version };
    const revision = await withdrawRevision({ ctx, ...address, input: body });
    return json(revision, { version: revision.version });
  },
);
