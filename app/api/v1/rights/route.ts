import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { listRights } from "@/lib/services/right/list";
import { putRight } from "@/lib/services/right/put";

export const GET = route("right.list", {}, async ({ ctx }) => json(await listRights({ ctx })));

export const PUT = route("right.put", { body: true }, async ({ ctx, body }) =>
  json(await putRight({ ctx, input: body })),
);
