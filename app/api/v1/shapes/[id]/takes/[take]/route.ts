import { noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { deleteTake } from "@/lib/services/take/delete";

export const DELETE = route("take.delete", {}, async ({ ctx, params }) => {
  await deleteTake({ ctx, shapeId: params.id ?? "", takeId: params.take ?? "" });
  return noContent();
});
