import type { Drawing } from "@/lib/drawing/schema";
import type { ShapeFamily } from "@/lib/schemas/shape";
import type { DemoBay } from "./firm";

/** How far a shape of the demo has come. */
export type DemoState = "draft" | "submitted" | "released";

export type DemoShape = Readonly<{
  designation: string;
  title: string;
  bay: DemoBay;
  family: ShapeFamily;
  drawing: Drawing;
  state?: DemoState;
  note?: string;
}>;
