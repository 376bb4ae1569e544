import { json } from "@/lib/http/answer";
import { openRoute } from "@/lib/http/route";
import { tryDatabase } from "@/lib/services/health/try-database";

export const GET = openRoute("health.ready", {}, async ({ ctx }) => json(await tryDatabase({ ctx })));
