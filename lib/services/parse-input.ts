import "server-only";
import type { z } from "zod";
import { AppError } from "@/lib/errors";
import type { Fault } from "@/lib/result";
import { plainDetail } from "./plain-detail";

const pointerOf = (path: readonly PropertyKey[]): string =>
  path.map((step) => `/${String(step).replaceAll("~", "~0").replaceAll("/", "~1")}`).join("");

/** One fault for each issue, with the JSON pointer of the field; an unknown field is named itself. */
const faultsOf = (issue: z.core.$ZodIssue): Fault[] => {
  if (issue.code === "unrecognized_keys") {
    return issue.keys.map((key) => ({
      code: "field.unknown",
      detail: `There is no field "${key}" here; remove it.`,
      pointer: pointerOf([...issue.path, key]),
    }));
  }
  if (issue.code === "invalid_union" && issue.errors.length > 0) {
    const nearest = issue.errors.reduce((a, b) => (b.length < a.length ? b : a));
    return nearest.flatMap((inner) => faultsOf({ ...inner, path: [...issue.path, ...inner.path] }));
  }
  return [{ code: `field.${issue.code}`, detail: plainDetail(issue), pointer: pointerOf(issue.path) }];
};

const MAX_ISSUES = 50;

/** Parses a verb's input, or refuses with every fault found (the first 50) and where it is. */
export const parseInput = <S extends z.ZodType>(schema: S, input: unknown): z.output<S> => {
  const parsed = schema.safeParse(input);
  if (parsed.success) return parsed.data;
  const issues = parsed.error.issues.flatMap(faultsOf).slice(0, MAX_ISSUES);
  const first = issues[0];
  throw new AppError("invalid", {
    user: first
      ? `${first.pointer ? `${first.pointer.slice(1)}: ` : ""}${first.detail}`
      : "The input is not valid.",
    issues,
  });
};
