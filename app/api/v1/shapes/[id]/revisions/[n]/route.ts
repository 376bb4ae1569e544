import { json, noContent } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { discardRevision } from "@/lib/services/revision/discard";
import { showRevision } from "@/lib/services/revision/show";
import { updateRevision } from "@/lib/services/revision/update";

export const GET = route("revision.show", {}, async ({ ctx, params }) => {
  const revision = await showRevision({ ctx, shapeId: params.id ?? "", ordinal: ordinalOf(params, "n") });
  return json(revision, { version: revision.version });
});

export const PATCH = route(
  "revision.update",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const address = { shapeId: params.id ?? "", ordinal: ordinalOf(params, "n"), version };
    const revision = await updateRevision({ ctx, ...address, input: body });
    return json(revision, { version: revision.version });
  },
);

export const DELETE = route("revision.discard", { version: true }, async ({ ctx, params, version }) => {
  await discardRevision({ ctx, shapeId: params.id ?? "", ordinal: ordinalOf(params, "n"), version });
  return noContent();
});
