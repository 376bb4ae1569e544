import { route } from "@/lib/http/route";
import { exportQueries } from "@/lib/services/delivery/export-queries";

export const GET = route("delivery.rows", {}, async ({ ctx, params }) => {
  const { fileName, pieces } = await exportQueries({ ctx, deliveryId: params.id ?? "" });
  const encoder = new TextEncoder();
  const body = new ReadableStream<Uint8Array>({
    async pull(controller) {
      const next = await pieces.next();
      if (next.done === true) controller.close();
      else controller.enqueue(encoder.encode(next.value));
    },
    async cancel() {
      await pieces.return(undefined);
    },
  });
  return new Response(body, {
    headers: {
      "content-type": "text/csv; charset=utf-8",
      "content-disposition": `attachment; filename="${fileName}"`,
    },
  });
});
