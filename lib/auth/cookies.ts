import "server-only";
import { environment } from "@/lib/env";

const secure = (): boolean => environment().PUBLIC_ORIGIN?.startsWith("https://") ?? false;

/** `__Host-` binds the cookie to this host, path and https; plain http on loopback cannot have it. */
const named = (name: string): string => (secure() ? `__Host-${name}` : name);

export const sessionCookieName = (): string => named("flitchbook");
/** Marks a browser in which an account has signed in before, so that strangers' tries do not count against it. */
export const deviceCookieName = (): string => named("flitchbook-device");

export const cookieOf = (name: string, value: string, seconds: number): string =>
  [
    `${name}=${value}`,
    "Path=/",
    "HttpOnly",
    "SameSite=Lax",
    `Max-Age=${seconds}`,
    ...(secure() ? ["Secure"] : []),
  ].join("; ");

export const expiredCookie = (name: string): string => cookieOf(name, "", 0);

/** Value of a cookie in a request's header; the first one counts. */
export const readCookie = (header: string | null, name: string): string | null => {
  for (const pair of header?.split(";") ?? []) {
    const [key, ...rest] = pair.split("=");
    if (key?.trim() === name) return rest.join("=").trim() || null;
  }
  return null;
};
