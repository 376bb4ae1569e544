import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { showMe } from "@/lib/services/me/show";
import { updateMe } from "@/lib/services/me/update";

export const GET = route("me.show", {}, async ({ ctx }) => {
  const me = await showMe({ ctx });
  return json(me, { version: me.version });
});

export const PATCH = route("me.update", { body: true, version: true }, async ({ ctx, body, version }) => {
  const me = await updateMe({ ctx, version, input: body });
  return json(me, { version: me.version });
});
