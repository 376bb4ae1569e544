import type { Fault, Result } from "@/lib/result";

/** The value of a result that a test expects to succeed; fails with the fault otherwise. */
export const must = <T>(result: Result<T, unknown>): T => {
  if (!result.ok) throw new Error(`expected a value, got ${JSON.stringify(result.error)}`);
  return result.value;
};

/** The fault of a result that a test expects to fail. */
export const fault = <T>(result: Result<T>): Fault => {
  if (result.ok) throw new Error("expected a fault, got a value");
  return result.error;
};
