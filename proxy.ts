import { NextResponse, type NextRequest } from "next/server";
import { contentSecurityPolicy, NONCE_HEADER } from "@/app/content-security";

/** Sets a fresh nonce and the headers that depend on the request. It stops nobody: every page asks for the actor itself. */
export function proxy(request: NextRequest): NextResponse {
  const nonce = crypto.randomUUID().replaceAll("-", "");
  const policy = contentSecurityPolicy(nonce, process.env.NODE_ENV === "development");
  const forwarded = new Headers(request.headers);
  forwarded.set(NONCE_HEADER, nonce);
  forwarded.set("content-security-policy", policy);
  const response = NextResponse.next({ request: { headers: forwarded } });
  response.headers.set("content-security-policy", policy);
  response.headers.set("cache-control", "no-store");
  if (process.env.PUBLIC_ORIGIN?.startsWith("https:"))
    response.headers.set("strict-transport-security", "max-age=31536000; includeSubDomains");
  return response;
}

// Pages only: a proxy that matched a route would cut its bodies at about 10 MB without a word.
export const config = { matcher: ["/((?!api/|_next/|logo\\.svg$|favicon\\.ico$).*)"] };
