import type { DrawingJoint, PartShape } from "@/lib/drawing/schema";
import type { Point } from "@/lib/geometry/region";
import type { Fault, Result } from "@/lib/result";

/** Sizes of a starter by key, mm. */
export type StarterValues = Readonly<Record<string, number>>;

export type StarterField = Readonly<{
  key: string;
  label: string;
  /** What stands in the form at first, mm. */
  first: number;
  /** Whether 0 is a size here (gaps, radii). */
  mayBeZero?: boolean;
}>;

/** One part of a starter about the starter's own origin: middle of the underside. */
export type StarterPart = Readonly<{
  role: string;
  name: string;
  shape: PartShape;
  at: Point;
  angle?: number;
  mirror?: boolean;
  timber?: boolean;
}>;

export type StarterJoint = Readonly<{ between: readonly [string, string]; kind: DrawingJoint["kind"] }>;

export type Starter = Readonly<{
  id: string;
  name: string;
  /** One line on what it makes. */
  note: string;
  fields: readonly StarterField[];
  parts: (v: StarterValues) => Result<readonly StarterPart[], Fault>;
  joints: readonly StarterJoint[];
}>;

export const plate = (
  role: string,
  name: string,
  width: number,
  height: number,
  x: number,
  y: number,
): StarterPart => ({ role, name, shape: { kind: "plate", width, height }, at: { x, y } });

/** A size from the values; fields are checked before a starter is built, so a missing one is a bug. */
export const sizeIn = (v: StarterValues, key: string): number => {
  const value = v[key];
  if (value === undefined) throw new Error(`starter: no value for ${key}`);
  return value;
};

export const fillet = (a: string, b: string): StarterJoint => ({ between: [a, b], kind: "fillet" });
