"use client";
import { useState } from "react";
import { Button } from "@/components/ui/button";
import { ProgressDimension } from "@/components/ui/waiting";
import { sentenceOf } from "@/lib/client/api";
import { sendStop } from "@/lib/client/deliveries";
import type { Delivery } from "@/lib/schemas/delivery";

const WORDS = {
  reading: [
    "Reading and computing",
    "Every row is drawn from its dimensions and computed. You may leave: it goes on without this page.",
  ],
  "putting-away": ["Putting away", "All rows go onto the Rack in one deed: all of them, or none."],
  received: ["Waiting to be read", "It begins in a moment."],
} as const;

/** A job at work: a dimension line that grows, and a way to stop what can be stopped. */
export function WorkingNotice({ delivery }: Readonly<{ delivery: Delivery }>) {
  const [asked, setAsked] = useState<string | null>(null);
  const { state } = delivery;
  const [label, text] = state === "reading" || state === "putting-away" ? WORDS[state] : WORDS.received;
  const stop = async () => {
    setAsked("It stops after the rows in hand.");
    try {
      await sendStop(delivery.id)();
    } catch (cause) {
      setAsked(sentenceOf(cause));
    }
  };
  return (
    <div className="p-6">
      <ProgressDimension
        label={label}
        done={Math.round((delivery.progress ?? 0) * 100)}
        total={100}
        unit="%"
      />
      <p className="mt-2 max-w-xl text-ink-2">{text}</p>
      {state !== "putting-away" && (
        <div className="mt-3 flex items-center gap-3">
          <Button onClick={() => void stop()} disabled={asked !== null}>
            Stop
          </Button>
          <span role="status" className="text-note text-ink-3">
            {asked}
          </span>
        </div>
      )}
    </div>
  );
}
