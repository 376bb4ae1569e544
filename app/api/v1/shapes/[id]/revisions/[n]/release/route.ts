import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { releaseRevision } from "@/lib/services/revision/release";

export const POST = route("revision.release", { version: true }, async ({ ctx, params, version }) => {
  const address = { shapeId: params.id ?? "", ordinal: ordinalOf(params, "n"), version };
  const revision = await releaseRevision({ ctx, ...address });
  return json(revision, { version: revision.version });
});
