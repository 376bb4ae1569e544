import { openRoute } from "@/lib/http/route";
import { notFound } from "@/lib/services/not-found";

/** Addresses that no route has answer the same problem document as things that do not exist. */
const refuse = async (): Promise<Response> => {
  throw notFound();
};

export const GET = openRoute("api.unknown", {}, refuse);
export const POST = openRoute("api.unknown", {}, refuse);
export const PUT = openRoute("api.unknown", {}, refuse);
export const PATCH = openRoute("api.unknown", {}, refuse);
export const DELETE = openRoute("api.unknown", {}, refuse);
