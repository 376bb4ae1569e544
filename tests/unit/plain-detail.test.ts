import { expect, test } from "vitest";
import { z } from "zod";
import { parseInput } from "@/lib/services/parse-input";
import { CreateShapeInput } from "@/lib/schemas/shape";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";

const detailOf = (schema: z.ZodType, value: unknown): string => {
  try {
    parseInput(schema, value);
  } catch (error) {
    return error instanceof Error && "issues" in error
      ? (error.issues as { detail: string }[]).map((issue) => issue.detail).join("; ")
      : "";
  }
  return "";
};

test.each([
  [z.strictObject({ a: z.number() }), {}, "is missing"],
  [z.strictObject({ a: z.number() }), { a: "1" }, "must be a number"],
  [z.strictObject({ a: z.string().min(1) }), { a: "" }, "must not be empty"],
  [z.strictObject({ a: z.number().min(0) }), { a: -1 }, "must be at least 0"],
  [z.strictObject({ a: z.number().positive() }), { a: 0 }, "must be more than 0"],
  [z.strictObject({ a: z.array(z.string()).max(1) }), { a: ["x", "y"] }, "must have at most 1 entries"],
  [z.strictObject({ a: z.enum(["x", "y"]) }), { a: "z" }, "must be one of x, y"],
  [z.strictObject({ a: z.number() }), { a: 1, b: 2 }, 'There is no field "b" here; remove it.'],
])("%# says in plain words what is wrong", (schema, value, detail) => {
  expect(detailOf(schema, value)).toBe(detail);
});

test("a fault deep in a drawing is named by its place", () => {
  const drawing = rectangleDrawing(20, -5);
  expect(() =>
    parseInput(CreateShapeInput, { bayId: "b", family: "custom", designation: "A", drawing }),
  ).toThrow(
    expect.objectContaining({
      issues: [expect.objectContaining({ pointer: "/drawing/parts/0/shape/height" })],
    }),
  );
});
