import "server-only";
import { uniqueViolation } from "@/db/retry";
import { AppError } from "@/lib/errors";

/** A designation that is in the library already, ignoring case, is a conflict that names the field. */
export const refuseTakenDesignation = (error: unknown): never => {
  if (!uniqueViolation(error)?.includes("designation_key")) throw error;
  const detail = "That designation is already in the library.";
  throw new AppError("conflict", {
    user: detail,
    issues: [{ code: "designation.taken", detail, pointer: "/designation" }],
    cause: error,
  });
};
