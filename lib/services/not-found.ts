import "server-only";
import { AppError } from "@/lib/errors";

/** What does not exist and what belongs to another organisation answer the same. */
export const notFound = (): AppError => new AppError("notFound", { user: "There is no such thing here." });

export const found = <T>(row: T | undefined): T => {
  if (row === undefined) throw notFound();
  return row;
};
