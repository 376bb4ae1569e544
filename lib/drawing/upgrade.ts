import type { Drawing } from "@/lib/drawing/schema";
import { DrawingV1 } from "@/lib/drawing/schema";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import type { z } from "zod";

/** The version that is written today. */
export const DRAWING_VERSION = 1;

/** From each older version, how a document becomes the next one. Version 1 is the first, so there is none yet. */
type Step = (document: Readonly<Record<string, unknown>>) => Record<string, unknown>;
const STEPS: Readonly<Record<number, Step>> = {};

/** A JSON pointer (RFC 6901) from the keys that lead to a value. */
export const jsonPointer = (path: readonly PropertyKey[]): string =>
  path.map((key) => `/${String(key).replaceAll("~", "~0").replaceAll("/", "~1")}`).join("");

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === "object" && value !== null && !Array.isArray(value);

const partAt = (document: unknown, path: readonly PropertyKey[]): string | undefined => {
  if (path[0] !== "parts" || typeof path[1] !== "number" || !isRecord(document)) return undefined;
  const part: unknown = Array.isArray(document.parts) ? document.parts[path[1]] : undefined;
  return isRecord(part) && typeof part.id === "string" ? part.id : undefined;
};

/** zod reports a failed union as one issue with the issues of each choice: those of the choice that came nearest help most. */
const nearest = (issue: z.core.$ZodIssue): readonly z.core.$ZodIssue[] => {
  if (issue.code !== "invalid_union" || issue.errors.length === 0) return [issue];
  const depth = (choice: readonly z.core.$ZodIssue[]) =>
    choice.reduce(
      (least, { path, code }) => Math.max(least, code === "unrecognized_keys" ? 0 : path.length),
      0,
    );
  const weight = (choice: readonly z.core.$ZodIssue[]) => depth(choice) - choice.length / 100;
  const best = issue.errors.reduce((a, b) => (weight(b) > weight(a) ? b : a));
  return best.flatMap((inner) => nearest({ ...inner, path: [...issue.path, ...inner.path] }));
};

const faultOf = (document: unknown, issue: z.core.$ZodIssue): Fault => {
  const part = partAt(document, issue.path);
  return {
    code: `drawing.${issue.code}`,
    detail: issue.message,
    pointer: jsonPointer(issue.path),
    ...(part === undefined ? {} : { part }),
  };
};

const unknownVersion = (version: unknown): Fault => ({
  code: "drawing.version",
  detail:
    typeof version === "number" && version > DRAWING_VERSION
      ? `This drawing has version ${version}, newer than this program knows (${DRAWING_VERSION}). Update the program to open it.`
      : `A drawing begins with "version": ${DRAWING_VERSION}.`,
  pointer: "/version",
});

/**
 * A drawing read from JSON of any version: brought to today's version step by step, then checked against the schema.
 * @param json what was parsed, trusted in nothing.
 * @returns the drawing, or one fault for each thing wrong, with a JSON pointer and the part's id where it has one.
 */
export const readDrawing = (json: unknown): Result<Drawing, readonly Fault[]> => {
  if (!isRecord(json))
    return err([
      {
        code: "drawing.notAnObject",
        detail: "A drawing is a JSON object with parts and materials.",
        pointer: "",
      },
    ]);
  let document = json;
  for (;;) {
    const { version } = document;
    if (version === DRAWING_VERSION) break;
    const step = typeof version === "number" && Object.hasOwn(STEPS, version) ? STEPS[version] : undefined;
    if (step === undefined) return err([unknownVersion(version)]);
    document = step(document);
  }
  const parsed = DrawingV1.safeParse(document);
  if (parsed.success) return ok(parsed.data);
  return err(parsed.error.issues.flatMap(nearest).map((issue) => faultOf(document, issue)));
};
