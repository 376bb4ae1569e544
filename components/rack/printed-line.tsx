"use client";
import { useEffect, useState } from "react";
import { flushSync } from "react-dom";
import { When } from "@/components/display/when";

/** On paper only: when it was printed, by whom, and from which address. */
export function PrintedLine({ by }: { by: string }) {
  const [printed, setPrinted] = useState<Readonly<{ at: string; address: string }> | null>(null);
  useEffect(() => {
    const onPrint = () =>
      flushSync(() =>
        setPrinted({
          at: new Date().toISOString(),
          address: window.location.host + window.location.pathname,
        }),
      );
    window.addEventListener("beforeprint", onPrint);
    return () => window.removeEventListener("beforeprint", onPrint);
  }, []);
  if (!printed) return null;
  return (
    <p className="hidden font-num break-all print:block">
      Printed <When at={printed.at} minute />, by {by}. {printed.address}
    </p>
  );
}
