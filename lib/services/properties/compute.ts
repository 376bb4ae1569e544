import "server-only";
import type { z } from "zod";
import { mayAtAll } from "@/lib/permissions";
import { ComputePropertiesInput, type ComputedProperties } from "@/lib/schemas/properties";
import { computeFigures } from "../compute/compute-figures";
import type { VerbArgs } from "../context";
import { parseInput } from "../parse-input";

/** Properties of any drawing; nothing is stored. The signal of a request that went away stops the computation. */
export const computeDrawingProperties = async ({
  ctx,
  input,
  signal,
}: VerbArgs<
  z.input<typeof ComputePropertiesInput>,
  { signal?: AbortSignal }
>): Promise<ComputedProperties> => {
  mayAtAll(ctx.actor, "properties.compute");
  const { drawing } = parseInput(ComputePropertiesInput, input);
  return computeFigures(drawing, signal);
};
