import { noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { deleteComment } from "@/lib/services/comment/delete";

export const DELETE = route("comment.delete", {}, async ({ ctx, params }) => {
  await deleteComment({ ctx, shapeId: params.id ?? "", commentId: params.comment ?? "" });
  return noContent();
});
