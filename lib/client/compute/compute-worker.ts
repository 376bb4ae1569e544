import { benchFigures, type BenchAnswer, type BenchRequest } from "@/lib/client/compute/bench-figures";
import { runInSlices } from "@/lib/client/compute/run-in-slices";

export type ToWorker = Readonly<{ sequence: number; request: BenchRequest }>;
/** `stopped` where a later request came before this one was done; `failed` where the engine threw, which is a bug. */
export type FromWorker = Readonly<
  { sequence: number } & (
    { kind: "answer"; answer: BenchAnswer } | { kind: "stopped" } | { kind: "failed"; message: string }
  )
>;

let latest = 0;

const answer = async ({ sequence, request }: ToWorker): Promise<FromWorker> => {
  try {
    const found = await runInSlices(benchFigures(request), () => latest === sequence);
    return found ? { sequence, kind: "answer", answer: found } : { sequence, kind: "stopped" };
  } catch (cause) {
    return { sequence, kind: "failed", message: cause instanceof Error ? cause.message : String(cause) };
  }
};

self.onmessage = (event: MessageEvent<ToWorker>) => {
  latest = event.data.sequence;
  void answer(event.data).then((message) => self.postMessage(message));
};
