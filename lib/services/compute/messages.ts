import type { Drawing } from "@/lib/drawing/schema";
import type { Fault, Result } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";

/** What goes to a compute thread and comes back; `seq` ties the two together. */
export type ComputeRequest = Readonly<{ seq: number; drawing: Drawing }>;
export type ComputeReply = Readonly<{ seq: number; result: Result<SectionProperties, readonly Fault[]> }>;
