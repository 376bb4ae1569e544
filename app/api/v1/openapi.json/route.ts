import { json } from "@/lib/http/answer";
import { openApiDocument } from "@/lib/http/openapi";
import { openRoute } from "@/lib/http/route";

export const GET = openRoute("openapi.show", {}, async () => json(openApiDocument()));
