import { route } from "@/lib/http/route";
import { streamText } from "@/lib/http/stream";
import { exportShapes } from "@/lib/services/shape/export";

export const GET = route("shape.export", {}, async ({ ctx, query }) =>
  streamText(await exportShapes({ ctx, input: query, format: "csv" }), {
    "content-type": "text/csv; charset=utf-8; header=present",
    "content-disposition": 'attachment; filename="shapes.csv"',
  }),
);
