import { parentPort } from "node:worker_threads";
import { computeWithTorsion } from "@/lib/drawing/compute-with-torsion";
import { sectionOf } from "@/lib/drawing/section-of";
import { figureSvg } from "@/lib/export/svg";
import { sectionFigure } from "@/lib/figure/section-figure";
import { ok } from "@/lib/result";
import { sectionProperties } from "@/lib/section/section-properties";
import { runToEnd } from "@/lib/section/torsion/run-to-end";
import type { Computed, ComputeReply, ComputeRequest, ComputeTask } from "./messages";

/** Torsion gives up well before the pool ends the thread, so that the area properties are still answered. */
const TORSION_LIMIT_MS = 6_000;

type FigureTask = Extract<ComputeTask, { kind: "figure" }>;

const drawFigure = ({ drawing, widthPx, heightPx, title, captions }: FigureTask): Computed<"figure"> => {
  const section = sectionOf(drawing);
  if (!section.ok) return section;
  const properties = sectionProperties(section.value);
  const list = sectionFigure({
    drawing,
    section: section.value,
    properties: properties.ok ? properties.value : null,
    fit: { widthPx, heightPx },
  });
  return ok(figureSvg({ list, widthPx, heightPx, title, captions }));
};

const answer = (task: ComputeTask): ComputeReply["result"] => {
  switch (task.kind) {
    case "properties":
      return runToEnd(computeWithTorsion(task.drawing, { timeLimitMs: TORSION_LIMIT_MS }));
    case "figure":
      return drawFigure(task);
  }
};

parentPort?.on("message", ({ seq, task }: ComputeRequest) => {
  const reply: ComputeReply = { seq, result: answer(task) };
  parentPort?.postMessage(reply);
});
