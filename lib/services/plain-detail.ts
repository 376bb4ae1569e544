import "server-only";
import type { z } from "zod";

const NAMES: Readonly<Record<string, string>> = {
  string: "text",
  number: "a number",
  int: "a whole number",
  boolean: "true or false",
  array: "a list",
  object: "an object",
  record: "an object",
  null: "null",
};

const listed = (values: readonly unknown[]): string => values.map(String).join(", ");

const bounded = (origin: string, limit: number | bigint, word: string): string => {
  if (origin === "string") return `must have ${word} ${limit} characters`;
  if (origin === "array" || origin === "set") return `must have ${word} ${limit} entries`;
  return `must be ${word} ${limit}`;
};

/** What is wrong with a field in plain words; the schemas' own sentences are kept. */
export const plainDetail = (issue: z.core.$ZodIssue): string => {
  switch (issue.code) {
    case "invalid_type":
      return issue.message.endsWith("received undefined")
        ? "is missing"
        : `must be ${NAMES[issue.expected] ?? issue.expected}`;
    case "too_small":
      if (!issue.message.startsWith("Too small")) return issue.message;
      if (issue.origin === "string" && issue.minimum === 1) return "must not be empty";
      return bounded(issue.origin, issue.minimum, issue.inclusive === false ? "more than" : "at least");
    case "too_big":
      if (!issue.message.startsWith("Too big")) return issue.message;
      return bounded(issue.origin, issue.maximum, issue.inclusive === false ? "less than" : "at most");
    case "invalid_value":
      return `must be ${issue.values.length === 1 ? "" : "one of "}${listed(issue.values)}`;
    case "invalid_union":
      return "fits none of the forms that are allowed here";
    default:
      return issue.message.startsWith("Invalid") ? "is not written as it should be" : issue.message;
  }
};
