import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { listLetters } from "@/lib/services/letter/list";

export const GET = route("letter.list", {}, async ({ ctx }) => json(await listLetters({ ctx })));
