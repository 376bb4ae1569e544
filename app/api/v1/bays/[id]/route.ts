import { json, noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { deleteBay } from "@/lib/services/bay/delete";
import { updateBay } from "@/lib/services/bay/update";

export const PATCH = route(
  "bay.update",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const bay = await updateBay({ ctx, bayId: params.id ?? "", version, input: body });
    return json(bay, { version: bay.version });
  },
);

export const DELETE = route("bay.delete", { version: true }, async ({ ctx, params, version }) => {
  await deleteBay({ ctx, bayId: params.id ?? "", version });
  return noContent();
});
