import "server-only";
import { AppError } from "@/lib/errors";

/** Refuses a change that was made from another state than the one stored. */
export const requireSameVersion = (stored: number, given: number): void => {
  if (stored === given) return;
  throw new AppError("stale", {
    user: "Somebody changed this since you opened it. Look at both states, then save again.",
  });
};
