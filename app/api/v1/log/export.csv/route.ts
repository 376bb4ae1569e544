import { route } from "@/lib/http/route";
import { streamText } from "@/lib/http/stream";
import { exportLog } from "@/lib/services/log/export";

export const GET = route("log.export", {}, async ({ ctx, query }) =>
  streamText(await exportLog({ ctx, input: query }), {
    "content-type": "text/csv; charset=utf-8; header=present",
    "content-disposition": 'attachment; filename="log.csv"',
  }),
);
