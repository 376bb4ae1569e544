import "server-only";
import type { Drawing } from "@/lib/drawing/schema";
import { AppError } from "@/lib/errors";
import type { Fault } from "@/lib/result";
import type { ComputedProperties } from "@/lib/schemas/properties";
import { ENGINE_VERSION } from "./engine-version";
import { computePool } from "./pool";

const underDrawing = (fault: Fault): Fault => ({ ...fault, pointer: `/drawing${fault.pointer ?? ""}` });

/** The figures of a drawing, by the engine, in a thread; a drawing that has none is refused with what is wrong and where. */
export const computeFigures = async (drawing: Drawing, signal?: AbortSignal): Promise<ComputedProperties> => {
  const result = await computePool().run({ kind: "properties", drawing }, signal ? { signal } : {});
  if (result.ok) return { properties: result.value, engineVersion: ENGINE_VERSION };
  const issues = result.error.map(underDrawing);
  throw new AppError("invalid", {
    user: issues[0]?.detail ?? "The drawing cannot be computed.",
    issues,
  });
};
