import type { Fault } from "@/lib/result";

/** RFC 9457 problem document as the server answers it. */
export type Problem = Readonly<{
  type?: string;
  title?: string;
  status: number;
  detail?: string;
  requestId?: string;
  issues?: readonly Fault[];
}>;

/** A refused or failed call. `status` 0: the server could not be reached. `message` is a sentence for the person. */
export class ApiProblem extends Error {
  readonly status: number;
  readonly issues: readonly Fault[];
  readonly requestId: string | null;
  readonly retryAfterSeconds: number | null;

  constructor(problem: Problem, retryAfterSeconds: number | null = null, cause?: unknown) {
    super(problem.detail ?? problem.title ?? "The server refused and did not say why.", { cause });
    this.name = "ApiProblem";
    this.status = problem.status;
    this.issues = problem.issues ?? [];
    this.requestId = problem.requestId ?? null;
    this.retryAfterSeconds = retryAfterSeconds;
  }

  /** Somebody else changed it first. */
  get stale(): boolean {
    return this.status === 409 || this.status === 412;
  }
  /** Waiting and trying again can help. */
  get passing(): boolean {
    return this.status === 0 || this.status === 503;
  }
  /** The sentence that belongs to a field, by its JSON pointer ("/email"). */
  issueAt(pointer: string): string | null {
    return this.issues.find((issue) => issue.pointer === pointer)?.detail ?? null;
  }
}

export type Answer<T> = Readonly<{ data: T; etag: string | null }>;
export type Query = Readonly<
  Record<string, string | number | boolean | null | undefined | readonly string[]>
>;

/** Address of a route under /api/v1; what is null, undefined or "" is left out. */
export function apiUrl(path: string, query: Query = {}): string {
  const params = new URLSearchParams();
  for (const [key, value] of Object.entries(query)) {
    if (value === null || value === undefined || value === "") continue;
    if (Array.isArray(value)) value.forEach((v) => params.append(key, String(v)));
    else params.set(key, String(value));
  }
  const search = params.toString();
  return `/api/v1${path}${search && `?${search}`}`;
}

type CallOptions = Readonly<{
  query?: Query;
  body?: unknown;
  /** ETag of the state the change was made from. */
  ifMatch?: string | null;
  signal?: AbortSignal;
}>;

async function call<T>(method: string, path: string, options: CallOptions = {}): Promise<Answer<T>> {
  const headers = new Headers({ accept: "application/json" });
  if (options.body !== undefined) headers.set("content-type", "application/json");
  if (options.ifMatch) headers.set("if-match", options.ifMatch);
  let response: Response;
  try {
    response = await fetch(apiUrl(path, options.query), {
      method,
      headers,
      ...(options.body !== undefined && { body: JSON.stringify(options.body) }),
      ...(options.signal && { signal: options.signal }),
      credentials: "same-origin",
      cache: "no-store",
    });
  } catch (cause) {
    if (options.signal?.aborted) throw cause;
    throw new ApiProblem(
      { status: 0, detail: "The server does not answer. Nothing was changed; try again." },
      null,
      cause,
    );
  }
  if (!response.ok) throw await problemOf(response);
  const text = await response.text();
  return { data: trusted<T>(text === "" ? null : JSON.parse(text)), etag: response.headers.get("etag") };
}

/** The one cast of this folder: the server's answers are checked against their schemas by the server's own tests. */
const trusted = <T>(data: unknown): T => data as T;

async function problemOf(response: Response): Promise<ApiProblem> {
  const retryAfter = Number(response.headers.get("retry-after") ?? NaN);
  const text = await response.text();
  const fallback: Problem = { status: response.status, detail: `The server answered ${response.status}.` };
  return new ApiProblem(
    response.headers.get("content-type")?.includes("json")
      ? { ...fallback, ...parseProblem(text) }
      : fallback,
    Number.isFinite(retryAfter) ? retryAfter : null,
  );
}

function parseProblem(text: string): Partial<Problem> {
  try {
    return trusted<Partial<Problem>>(JSON.parse(text));
  } catch {
    return {};
  }
}

export const api = {
  get: <T>(path: string, options?: CallOptions) => call<T>("GET", path, options),
  post: <T>(path: string, options?: CallOptions) => call<T>("POST", path, options),
  put: <T>(path: string, options?: CallOptions) => call<T>("PUT", path, options),
  patch: <T>(path: string, options?: CallOptions) => call<T>("PATCH", path, options),
  delete: <T>(path: string, options?: CallOptions) => call<T>("DELETE", path, options),
};

/** The sentence to show for anything thrown by a call. */
export const sentenceOf = (cause: unknown): string =>
  cause instanceof ApiProblem
    ? cause.message
    : "Something went wrong on this page. Nothing was changed; try again.";
