import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { updateMember } from "@/lib/services/member/update";

export const PATCH = route(
  "member.update",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const member = await updateMember({
      ctx,
      memberId: params.id ?? "",
      version,
      input: body,
    });
    return json(member, { version: member.version });
  },
);
