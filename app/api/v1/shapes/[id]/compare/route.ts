import { json } from "@/lib/http/answer";
import { ordinalOf, route } from "@/lib/http/route";
import { compareRevisions } from "@/lib/services/revision/compare";

export const GET = route("revision.compare", {}, async ({ ctx, params, query }) => {
  const between = { from: ordinalOf(query, "from"), to: ordinalOf(query, "to") };
  return json(await compareRevisions({ ctx, shapeId: params.id ?? "", ...between }));
});
