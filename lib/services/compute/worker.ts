import { parentPort } from "node:worker_threads";
import { computeWithTorsion } from "@/lib/drawing/compute-with-torsion";
import { runToEnd } from "@/lib/section/torsion/run-to-end";
import type { ComputeReply, ComputeRequest } from "./messages";

/** Torsion gives up well before the pool ends the thread, so that the area properties are still answered. */
const TORSION_LIMIT_MS = 6_000;

parentPort?.on("message", ({ seq, drawing }: ComputeRequest) => {
  const steps = computeWithTorsion(drawing, { timeLimitMs: TORSION_LIMIT_MS });
  const reply: ComputeReply = { seq, result: runToEnd(steps) };
  parentPort?.postMessage(reply);
});
