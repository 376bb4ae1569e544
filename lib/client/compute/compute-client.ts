import type { BenchAnswer, BenchRequest } from "@/lib/client/compute/bench-figures";
import type { FromWorker, ToWorker } from "@/lib/client/compute/compute-worker";
import { newDrawing } from "@/lib/drawing/new-drawing";
import { addParts } from "@/lib/drawing/edit-parts";
import { partFor } from "@/lib/drawing/add-row";

export type Computed = Readonly<{ request: BenchRequest; answer: BenchAnswer }>;

export type ComputeClient = Readonly<{
  /**
   * Asks for the figures of a drawing; of several requests only the last one is sure to be answered: with the areas, and
   * once more with torsion in them when the drawing stands still.
   */
  ask: (request: BenchRequest) => void;
  stop: () => void;
}>;

/** A request older than this no longer holds back the next one. */
const PATIENCE_MS = 250;

/**
 * The near side of the compute worker. One request is under way at a time, so that a fast hand still sees figures; what was
 * asked meanwhile is sent when it is answered, and only the newest of it.
 */
export const startCompute = (
  onComputed: (computed: Computed) => void,
  onFailed: (message: string) => void,
): ComputeClient => {
  const worker = new Worker(new URL("./compute-worker.ts", import.meta.url), { type: "module" });
  let sequence = 0;
  let underWay: { sequence: number; request: BenchRequest; since: number } | null = null;
  let waiting: BenchRequest | null = null;
  /** Answered with areas; its torsion may follow as a second answer. */
  let answered: { sequence: number; request: BenchRequest } | null = null;

  const send = (request: BenchRequest) => {
    sequence += 1;
    underWay = { sequence, request, since: performance.now() };
    worker.postMessage({ sequence, request } satisfies ToWorker);
  };
  worker.onmessage = ({ data }: MessageEvent<FromWorker>) => {
    if (answered !== null && data.sequence === answered.sequence) {
      if (data.kind === "answer") onComputed({ request: answered.request, answer: data.answer });
      if (data.kind === "failed") onFailed(data.message);
      return;
    }
    if (!underWay || data.sequence !== underWay.sequence) return;
    const { request } = underWay;
    answered = underWay;
    underWay = null;
    if (data.kind === "answer") onComputed({ request, answer: data.answer });
    if (data.kind === "failed") onFailed(data.message);
    const next = waiting;
    waiting = null;
    if (next) send(next);
  };
  worker.onerror = (event) => onFailed(event.message);

  const warmUp = newDrawing();
  send({
    drawing: addParts(warmUp, [partFor(warmUp, { kind: "plate", width: 10, height: 10 })]),
    picked: [],
  });
  return {
    ask: (request) => {
      if (underWay && performance.now() - underWay.since < PATIENCE_MS) waiting = request;
      else {
        waiting = null;
        send(request);
      }
    },
    stop: () => worker.terminate(),
  };
};
