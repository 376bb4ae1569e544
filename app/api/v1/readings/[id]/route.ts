import { json, noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { deleteReading } from "@/lib/services/reading/delete";
import { updateReading } from "@/lib/services/reading/update";

export const PATCH = route(
  "reading.update",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const reading = await updateReading({ ctx, readingId: params.id ?? "", version, input: body });
    return json(reading, { version: reading.version });
  },
);

export const DELETE = route("reading.delete", { version: true }, async ({ ctx, params, version }) => {
  await deleteReading({ ctx, readingId: params.id ?? "", version });
  return noContent();
});
