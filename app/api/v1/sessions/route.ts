import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { listSessions } from "@/lib/services/session/list";

export const GET = route("session.list", {}, async ({ ctx, sessionId }) =>
  json(await listSessions({ ctx, sessionId })),
);
