import type { Db } from "@/db/client";
import { createSession } from "@/lib/auth/sessions";
import type { Actor } from "@/lib/schemas/access";

export const ORIGIN = "http://127.0.0.1:3000";

type Handler = (
  request: Request,
  context: { params: Promise<Record<string, string>> | undefined },
) => Promise<Response>;

/** Lets the routes of this process answer from a test's database. */
export const serveFrom = (db: Db): void => {
  (globalThis as typeof globalThis & { flitchbookDb?: Promise<Db> }).flitchbookDb = Promise.resolve(db);
};

export const stopServing = (): void => {
  delete (globalThis as typeof globalThis & { flitchbookDb?: Promise<Db> }).flitchbookDb;
};

type Call = Readonly<{
  method?: string;
  path?: string;
  params?: Record<string, string>;
  body?: unknown;
  /** The body as it goes over the wire, instead of JSON of `body`. */
  raw?: string | Uint8Array<ArrayBuffer>;
  headers?: Record<string, string>;
  cookie?: string;
}>;

/** Calls a route handler as the server would, from its own origin unless the headers say otherwise. */
export const callRoute = (handler: Handler, call: Call = {}): Promise<Response> => {
  const { method = "GET", path = "/", params, body, raw, headers = {}, cookie } = call;
  const sent = new Headers({
    host: "127.0.0.1:3000",
    ...(method !== "GET" && { origin: ORIGIN }),
    ...((body !== undefined || raw !== undefined) && { "content-type": "application/json" }),
    ...(cookie && { cookie }),
  });
  for (const [name, value] of Object.entries(headers)) {
    if (value === "") sent.delete(name);
    else sent.set(name, value);
  }
  const payload = raw ?? (body === undefined ? null : JSON.stringify(body));
  const request = new Request(`${ORIGIN}${path}`, { method, headers: sent, body: payload });
  return handler(request, { params: params && Promise.resolve(params) });
};

/** The cookie of a fresh session of this person. */
export const cookieFor = async (db: Db, actor: Actor): Promise<string> => {
  const { token } = await createSession(db, { ...actor, userAgent: "test" }, Date.now());
  return `flitchbook=${token}`;
};
