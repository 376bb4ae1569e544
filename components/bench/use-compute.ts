"use client";
import { useEffect } from "react";
import { useBenchContext } from "@/components/bench/bench-store";
import { startCompute } from "@/lib/client/compute/compute-client";

/**
 * Keeps the figures up with the drawing: each change is sent to the worker, and an answer counts only for what is drawn or
 * was drawn last. Until it comes the old figures stay and are shown as stale.
 */
export const useCompute = (): void => {
  const { store } = useBenchContext();
  useEffect(() => {
    const client = startCompute(
      ({ request, answer }) => {
        const { history } = store.getState();
        if (request.drawing !== history.now && history.mark === null) return;
        if (answer.ok)
          store.setState({
            figures: answer.value,
            figuresOf: request.drawing,
            faults: [],
            engineFault: null,
          });
        else store.setState({ faults: answer.error, figuresOf: request.drawing, engineFault: null });
      },
      (engineFault) => store.setState({ engineFault }),
    );
    const ask = () => {
      const { history, picked } = store.getState();
      if (history.now.parts.length === 0)
        store.setState({ figures: null, figuresOf: history.now, faults: [] });
      else client.ask({ drawing: history.now, picked });
    };
    ask();
    const stopListening = store.subscribe((now, before) => {
      if (now.history.now !== before.history.now || now.picked !== before.picked) ask();
    });
    return () => {
      stopListening();
      client.stop();
    };
  }, [store]);
};
