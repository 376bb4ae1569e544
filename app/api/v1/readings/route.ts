import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createReading } from "@/lib/services/reading/create";
import { listReadings } from "@/lib/services/reading/list";

export const GET = route("reading.list", {}, async ({ ctx }) => json(await listReadings({ ctx })));

export const POST = route("reading.create", { body: true }, async ({ ctx, body }) => {
  const reading = await createReading({ ctx, input: body });
  return json(reading, { status: 201, version: reading.version });
});
