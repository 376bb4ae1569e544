import { noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { endMemberSessions } from "@/lib/services/member/end-sessions";

export const DELETE = route("member.endSessions", {}, async ({ ctx, params }) => {
  await endMemberSessions({ ctx, memberId: params.id ?? "" });
  return noContent();
});
