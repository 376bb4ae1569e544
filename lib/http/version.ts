import "server-only";
import { AppError } from "@/lib/errors";

export const etagOf = (version: number): string => `"${version}"`;

/** The version a change was made from (If-Match): missing is 428, not ours is 412. */
export const requireVersion = (request: Request): number => {
  const header = request.headers.get("if-match");
  if (header === null) {
    throw new AppError("noVersion", {
      user: "Say which state the change was made from: send its ETag in If-Match.",
    });
  }
  const found = /^(?:W\/)?"(\d{1,9})"$/.exec(header.trim());
  if (!found) throw new AppError("stale", { user: "If-Match must carry the ETag that was answered." });
  return Number(found[1]);
};
