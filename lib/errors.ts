import type { Fault } from "@/lib/result";

/** The one map from what went wrong to the HTTP status. */
export const HTTP_STATUS = {
  unreadable: 400,
  signedOut: 401,
  forbidden: 403,
  notFound: 404,
  conflict: 409,
  stale: 412,
  tooLarge: 413,
  wrongType: 415,
  invalid: 422,
  noVersion: 428,
  tooMany: 429,
  internal: 500,
  busy: 503,
  full: 507,
} as const;

export type ErrorCode = keyof typeof HTTP_STATUS;

type Details = Readonly<{
  /** One plain sentence for the person: what happened and what to do. */
  user: string;
  issues?: readonly Fault[];
  retryAfterSeconds?: number;
  cause?: unknown;
}>;

/** A refusal by a verb. `message` is for the log, `user` for the person; the cause is kept and never shown. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly user: string;
  readonly issues: readonly Fault[];
  readonly retryAfterSeconds: number | null;

  constructor(code: ErrorCode, details: Details) {
    super(`${code}: ${details.user}`, details.cause === undefined ? undefined : { cause: details.cause });
    this.name = "AppError";
    this.code = code;
    this.user = details.user;
    this.issues = details.issues ?? [];
    this.retryAfterSeconds = details.retryAfterSeconds ?? null;
  }
}
