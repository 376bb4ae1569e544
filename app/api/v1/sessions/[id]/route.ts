import { noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { endSession } from "@/lib/services/session/end";

export const DELETE = route("session.end", {}, async ({ ctx, params }) => {
  await endSession({ ctx, publicId: params.id ?? "" });
  return noContent();
});
