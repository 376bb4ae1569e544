import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { listMembers } from "@/lib/services/member/list";

export const GET = route("member.list", {}, async ({ ctx }) => json(await listMembers({ ctx })));
