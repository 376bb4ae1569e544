import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { showOrganisation } from "@/lib/services/organisation/show";
import { updateOrganisation } from "@/lib/services/organisation/update";

export const GET = route("organisation.show", {}, async ({ ctx }) => {
  const organisation = await showOrganisation({ ctx });
  return json(organisation, { version: organisation.version });
});

export const PATCH = route(
  "organisation.update",
  { body: true, version: true },
  async ({ ctx, body, version }) => {
    const organisation = await updateOrganisation({ ctx, version, input: body });
    return json(organisation, { version: organisation.version });
  },
);
