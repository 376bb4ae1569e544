import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createBay } from "@/lib/services/bay/create";
import { listBays } from "@/lib/services/bay/list";

export const GET = route("bay.list", {}, async ({ ctx }) => json(await listBays({ ctx })));

export const POST = route("bay.create", { body: true }, async ({ ctx, body }) => {
  const bay = await createBay({ ctx, input: body });
  return json(bay, { status: 201, version: bay.version });
});
