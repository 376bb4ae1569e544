/** Runs a computation to its end without a pause, as a worker does that has nothing else to do. */
export const runToEnd = <T>(steps: Generator<void, T>): T => {
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
  }
};
