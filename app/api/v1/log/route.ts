import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { listLog } from "@/lib/services/log/list";

export const GET = route("log.list", {}, async ({ ctx, query }) =>
  json(await listLog({ ctx, input: query })),
);
