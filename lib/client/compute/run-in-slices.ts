const SLICE_MS = 8;

/** Lets waiting messages in; a timer would wait at least 4 ms. */
const breathe = (): Promise<void> =>
  new Promise((resolve) => {
    const { port1, port2 } = new MessageChannel();
    port1.onmessage = () => {
      port1.close();
      resolve();
    };
    port2.postMessage(null);
  });

/**
 * Runs a generator in slices of 8 ms and asks between them whether it is still wanted.
 * @returns its result, or null when it was stopped.
 */
export async function runInSlices<T>(work: Generator<void, T>, wanted: () => boolean): Promise<T | null> {
  let until = performance.now() + SLICE_MS;
  for (;;) {
    const step = work.next();
    if (step.done) return step.value;
    if (performance.now() < until) continue;
    await breathe();
    if (!wanted()) return null;
    until = performance.now() + SLICE_MS;
  }
}
