import { benchFigures, type BenchAnswer, type BenchRequest } from "@/lib/client/compute/bench-figures";
import { benchTorsion } from "@/lib/client/compute/bench-torsion";
import { runInSlices } from "@/lib/client/compute/run-in-slices";
import { ok } from "@/lib/result";

export type ToWorker = Readonly<{ sequence: number; request: BenchRequest }>;
/** `stopped` where a later request came before this one was done; `failed` where the engine threw, which is a bug. */
export type FromWorker = Readonly<
  { sequence: number } & (
    { kind: "answer"; answer: BenchAnswer } | { kind: "stopped" } | { kind: "failed"; message: string }
  )
>;

let latest = 0;

/** A drawing that has stood still this long is worth its torsion; a hand that drags is not held up by it. */
const STILL_MS = 60;

const still = (): Promise<void> =>
  new Promise((resolve) => {
    setTimeout(resolve, STILL_MS);
  });

const failed = (sequence: number, cause: unknown): FromWorker => ({
  sequence,
  kind: "failed",
  message: cause instanceof Error ? cause.message : String(cause),
});

const send = (message: FromWorker) => self.postMessage(message);

/** The areas first, and when the drawing stands still a second answer to the same request with torsion in it. */
const answer = async ({ sequence, request }: ToWorker): Promise<void> => {
  const wanted = () => latest === sequence;
  try {
    const areas = await runInSlices(benchFigures(request), wanted);
    if (areas === null) return send({ sequence, kind: "stopped" });
    send({ sequence, kind: "answer", answer: areas });
    if (!areas.ok) return;
    await still();
    if (!wanted()) return;
    const all = await runInSlices(benchTorsion(areas.value), wanted);
    if (all !== null) send({ sequence, kind: "answer", answer: ok(all) });
  } catch (cause) {
    send(failed(sequence, cause));
  }
};

self.onmessage = (event: MessageEvent<ToWorker>) => {
  latest = event.data.sequence;
  void answer(event.data);
};
