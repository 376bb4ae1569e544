import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { showWaiting } from "@/lib/services/work/waiting";

export const GET = route("work.waiting", {}, async ({ ctx }) => json(await showWaiting({ ctx })));
