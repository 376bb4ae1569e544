import type { Drawing } from "@/lib/drawing/schema";
import type { Fault, Result } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";

/** What a compute thread can be asked. */
export type ComputeTask =
  | Readonly<{ kind: "properties"; drawing: Drawing }>
  | Readonly<{
      kind: "figure";
      drawing: Drawing;
      widthPx: number;
      heightPx: number;
      title: string;
      captions: readonly string[];
    }>;

/** What each kind of task answers: properties, or an SVG document. */
export type ComputeAnswers = Readonly<{ properties: SectionProperties; figure: string }>;
export type Computed<K extends ComputeTask["kind"]> = Result<ComputeAnswers[K], readonly Fault[]>;

/** What goes to a compute thread and comes back; `seq` ties the two together. */
export type ComputeRequest = Readonly<{ seq: number; task: ComputeTask }>;
export type ComputeReply = Readonly<{ seq: number; result: Computed<ComputeTask["kind"]> }>;
