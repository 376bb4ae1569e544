import "server-only";
import { AppError, HTTP_STATUS, type ErrorCode } from "@/lib/errors";
import { isBusy, isFull } from "@/db/retry";
import type { Problem } from "@/lib/schemas/common";

const TITLES: Record<ErrorCode, string> = {
  unreadable: "The request cannot be read",
  signedOut: "Not signed in",
  forbidden: "Not allowed",
  notFound: "Not found",
  conflict: "Conflict",
  stale: "Changed by somebody else",
  tooLarge: "Too large",
  wrongType: "Wrong content type",
  invalid: "Not valid",
  noVersion: "Version missing",
  tooMany: "Too many tries",
  internal: "Internal fault",
  busy: "Busy",
  full: "Disk full",
};

/** What went wrong as an AppError; a bug keeps its cause and says nothing of it. */
export const asAppError = (error: unknown): AppError => {
  if (error instanceof AppError) return error;
  if (isFull(error))
    return new AppError("full", { user: "The server's disk is full; nothing was saved.", cause: error });
  if (isBusy(error)) {
    return new AppError("busy", {
      user: "The library is busy; nothing was saved. Try again in a moment.",
      retryAfterSeconds: 5,
      cause: error,
    });
  }
  return new AppError("internal", {
    user: "The program failed here. It has been logged under the request id; nothing of this request was saved.",
    cause: error,
  });
};

/** RFC 9457 problem document. Never a stack, SQL, path or version. */
export const problemResponse = (error: AppError, requestId: string): Response => {
  const status = HTTP_STATUS[error.code];
  const body: Problem = {
    type: `urn:flitchbook:problem:${error.code}`,
    title: TITLES[error.code],
    status,
    detail: error.user,
    requestId,
    issues: error.issues.map((issue) => ({ ...issue })),
  };
  const headers = new Headers({
    "content-type": "application/problem+json; charset=utf-8",
    "cache-control": "no-store",
    "x-request-id": requestId,
  });
  if (error.retryAfterSeconds !== null) headers.set("retry-after", String(error.retryAfterSeconds));
  if (status === 401) headers.set("www-authenticate", "Bearer");
  return new Response(JSON.stringify(body), { status, headers });
};
