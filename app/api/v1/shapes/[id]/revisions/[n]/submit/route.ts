import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { submitRevision } from "@/lib/services/revision/submit";

export const POST = route("revision.submit", { version: true }, async ({ ctx, params, version }) => {
  const address = { shapeId: params.id ?? "", ordinal: ordinalOf(params, "n"), version };
  const revision = await submitRevision({ ctx, ...address });
  return json(revision, { version: revision.version });
});
