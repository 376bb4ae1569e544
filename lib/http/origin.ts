import "server-only";
import { environment } from "@/lib/env";
import { AppError } from "@/lib/errors";

const LOOPBACK = /^(localhost|127\.0\.0\.1|\[::1\])(:\d{1,5})?$/;

/** The origin changes must come from: the configured one; in the demo, this host as long as it is loopback. */
const expectedOrigin = (request: Request): string | null => {
  const { PUBLIC_ORIGIN } = environment();
  if (PUBLIC_ORIGIN !== undefined) return PUBLIC_ORIGIN;
  const host = request.headers.get("host") ?? "";
  return LOOPBACK.test(host) ? `http://${host}` : null;
};

/** Refuses a change whose Origin is missing or another's; without an Origin, Sec-Fetch-Site must say same-origin. */
export const requireOwnOrigin = (request: Request): void => {
  const origin = request.headers.get("origin");
  const same =
    origin === null
      ? request.headers.get("sec-fetch-site") === "same-origin"
      : origin === expectedOrigin(request);
  if (same) return;
  throw new AppError("forbidden", {
    user: "Changes are taken from this program's own pages only: the request's Origin is missing or another one.",
  });
};

/** The address a request came from: the socket's peer, or what as many trusted proxies as configured say before it. */
export const clientAddress = (request: Request): string => {
  const peer = request.headers.get("x-peer-address") ?? "unknown";
  const { TRUSTED_PROXIES } = environment();
  if (TRUSTED_PROXIES === 0) return peer;
  const told = (request.headers.get("x-forwarded-for") ?? "").split(",").map((part) => part.trim());
  const chain = [...told.filter(Boolean), peer];
  return chain[Math.max(0, chain.length - 1 - TRUSTED_PROXIES)] ?? peer;
};
