import "server-only";
import { database, type Db } from "@/db/client";
import { authenticate } from "@/lib/auth/authenticate";
import { AppError } from "@/lib/errors";
import { logger } from "@/lib/logger";
import { VERBS, type Verb } from "@/lib/permissions";
import type { Ctx, OpenCtx, Unparsed } from "@/lib/services/context";
import { newId } from "@/lib/services/new-id";
import { notFound } from "@/lib/services/not-found";
import { readJson } from "./body";
import { requireOwnOrigin } from "./origin";
import { asAppError, problemResponse } from "./problem";
import { requireVersion } from "./version";

type Params = Readonly<Record<string, string>>;
/** Next gives no params at all to a route without any. */
type NextContext = Readonly<{
  params: Promise<Record<string, string | string[] | undefined> | undefined> | undefined;
}>;
type Handler = (request: Request, context: NextContext) => Promise<Response>;

type Args = Readonly<{
  request: Request;
  params: Params;
  /** The query string; a parameter given several times is joined by commas. */
  query: Readonly<Record<string, string>>;
  /** The JSON body, for the verb to parse; empty unless `body` was asked for. */
  body: Unparsed;
  /** The version of If-Match; 0 unless `version` was asked for. */
  version: number;
  /** The open session's public id; null for tokens. */
  sessionId: string | null;
}>;

type Options = Readonly<{
  /** Reads a JSON body; a request without one, or with another type, is refused. */
  body?: boolean;
  /** Asks for If-Match. */
  version?: boolean;
}>;

/** A position in a path (a revision's or row's number); what is no number is not there. */
export const ordinalOf = (params: Params, name: string): number => {
  const text = params[name] ?? "";
  if (!/^[1-9]\d{0,8}$/.test(text)) throw notFound();
  return Number(text);
};

const queryOf = (request: Request): Record<string, string> => {
  const { searchParams } = new URL(request.url);
  const names = new Set(searchParams.keys());
  return Object.fromEntries([...names].map((name) => [name, searchParams.getAll(name).join(",")]));
};

const paramsOf = async (context: NextContext): Promise<Params> =>
  Object.fromEntries(
    Object.entries((await context.params) ?? {}).map(([name, value]) => [name, String(value ?? "")]),
  );

const isChange = (request: Request): boolean => !["GET", "HEAD", "OPTIONS"].includes(request.method);

/** For routes without a body; a verb that parses it refuses it. */
const nothing = {} as Unparsed;

const argsOf = async (request: Request, context: NextContext, options: Options) => ({
  request,
  params: await paramsOf(context),
  query: queryOf(request),
  version: options.version ? requireVersion(request) : 0,
  body: options.body ? await readJson(request) : nothing,
});

type Ids = Readonly<{ requestId: string; verb: Verb; person?: string; organisation?: string }>;

const refused = (error: unknown, ids: Ids): Response => {
  const known = asAppError(error);
  const line = { ...ids, code: known.code };
  if (known.code === "internal") logger().error({ ...line, err: known.cause }, "request failed");
  else if (known.code === "busy" || known.code === "full") logger().warn(line, known.message);
  else logger().info(line, "request refused");
  return problemResponse(known, ids.requestId);
};

const finished = (response: Response, requestId: string): Response => {
  response.headers.set("x-request-id", requestId);
  if (!response.headers.has("cache-control")) response.headers.set("cache-control", "no-store");
  return response;
};

/** A route of a verb that anyone may call. The origin is asked all the same. */
export const openRoute =
  (verb: Verb, options: Options, handle: (args: Args & { ctx: OpenCtx }) => Promise<Response>): Handler =>
  async (request, context) => {
    const ids = { requestId: newId(), verb };
    try {
      if (!("public" in VERBS[verb])) throw new Error(`${verb} is not public`);
      if (isChange(request)) requireOwnOrigin(request);
      const ctx: OpenCtx = { db: await database(), now: Date.now(), requestId: ids.requestId };
      const args = await argsOf(request, context, options);
      return finished(await handle({ ...args, sessionId: null, ctx }), ids.requestId);
    } catch (error) {
      return refused(error, ids);
    }
  };

/**
 * A route of a verb that needs somebody: reads the actor, asks for the origin of a change (a bearer token needs none),
 * reads version and body, calls the handler, and answers every error as a problem document.
 */
export const route =
  (verb: Verb, options: Options, handle: (args: Args & { ctx: Ctx }) => Promise<Response>): Handler =>
  async (request, context) => {
    let ids: Ids = { requestId: newId(), verb };
    try {
      const bearer = request.headers.has("authorization");
      if (isChange(request) && !bearer) requireOwnOrigin(request);
      const db: Db = await database();
      const now = Date.now();
      const who = await authenticate(db, request.headers, now);
      if (who === null)
        throw new AppError("signedOut", { user: "Sign in first; your session may have ended." });
      if (who.readOnly && isChange(request) && verb !== "properties.compute") {
        throw new AppError("forbidden", { user: "This token may only read." });
      }
      ids = { ...ids, person: who.actor.userId, organisation: who.actor.organisationId };
      const ctx: Ctx = { actor: who.actor, db, now, requestId: ids.requestId };
      const args = await argsOf(request, context, options);
      return finished(await handle({ ...args, sessionId: who.sessionId, ctx }), ids.requestId);
    } catch (error) {
      return refused(error, ids);
    }
  };
