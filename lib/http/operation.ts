import "server-only";
import type { z } from "zod";
import type { Verb } from "@/lib/permissions";

export type Operation = Readonly<{
  method: "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
  path: string;
  verb: Verb;
  summary: string;
  query?: z.ZodObject;
  body?: z.ZodType;
  answer?: z.ZodType;
  status?: number;
  /** Asks for If-Match. */
  version?: boolean;
  /** Answers or takes something else than JSON. */
  media?: string;
}>;

type More = Omit<Operation, "method" | "path" | "verb" | "summary">;

const op =
  (method: Operation["method"]) =>
  (path: string, verb: Verb, summary: string, more: More = {}): Operation => ({
    method,
    path,
    verb,
    summary,
    ...more,
  });
export const [get, post, put, patch, del] = [op("GET"), op("POST"), op("PUT"), op("PATCH"), op("DELETE")];

/** A change that answers nothing and asks for the version. */
export const GONE = { status: 204, version: true } as const;
