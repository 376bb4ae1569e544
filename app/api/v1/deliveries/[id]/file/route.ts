import { AppError } from "@/lib/errors";
import { json } from "@/lib/http/answer";
import { readBytes } from "@/lib/http/body";
import { route } from "@/lib/http/route";
import { MAX_FILE_BYTES } from "@/lib/intake/limits";
import { putDeliveryFile } from "@/lib/services/delivery/put-file";

const RAW =
  /^(text\/csv|text\/plain|text\/tab-separated-values|application\/octet-stream|application\/vnd\.ms-excel)\b/i;

/** The raw file as the body. A form would be kept in memory twice and cut by whoever reads it first. */
export const PUT = route("delivery.putFile", { version: true }, async ({ ctx, request, params, version }) => {
  if (!RAW.test(request.headers.get("content-type") ?? ""))
    throw new AppError("wrongType", {
      user: "Send the file itself, as text/csv or application/octet-stream.",
    });
  const bytes = await readBytes(request, MAX_FILE_BYTES);
  const delivery = await putDeliveryFile({ ctx, deliveryId: params.id ?? "", version, bytes });
  return json(delivery, { version: delivery.version });
});
