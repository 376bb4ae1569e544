import { parentPort } from "node:worker_threads";
import { computeProperties } from "@/lib/drawing/compute-properties";
import type { ComputeReply, ComputeRequest } from "./messages";

parentPort?.on("message", ({ seq, drawing }: ComputeRequest) => {
  const reply: ComputeReply = { seq, result: computeProperties(drawing) };
  parentPort?.postMessage(reply);
});
