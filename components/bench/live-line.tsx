"use client";
import { useEffect, useState } from "react";
import { useBench, useBenchContext } from "@/components/bench/bench-store";
import { useDisplay } from "@/components/display/display-provider";
import { propertyRule } from "@/lib/units/display-units";
import { readText, setStored } from "@/lib/units/format";
import type { PropertyKey } from "@/lib/units/property-units";
import { symbolOf, symbolText } from "@/lib/units/notation";
import { unitText } from "@/lib/units/unit-text";

const REST_MS = 500;

/** Speaks what was done at once, and A, I and S after half a second of rest. */
export const LiveLine = () => {
  const { store } = useBenchContext();
  const said = useBench((s) => s.said);
  const { settings } = useDisplay();
  const [figures, setFigures] = useState("");
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const stop = store.subscribe((now, before) => {
      if (now.figures === before.figures) return;
      clearTimeout(timer);
      timer = setTimeout(() => {
        const p = store.getState().figures?.properties;
        const words = (key: PropertyKey, value: number) => {
          const rule = propertyRule(key, settings.system);
          return `${symbolText(symbolOf(key, settings.notation))} ${readText(setStored(value, rule, settings.decimal))} ${unitText(rule.unit)}`;
        };
        setFigures(p ? `${words("area", p.area)}, ${words("Ix", p.Ix)}, ${words("Sx", p.Sx)}` : "");
      }, REST_MS);
    });
    return () => {
      stop();
      clearTimeout(timer);
    };
  }, [store, settings]);
  return (
    <>
      <p aria-live="polite" className="sr-only">
        {said}
      </p>
      <p aria-live="polite" data-figures className="sr-only">
        {figures}
      </p>
    </>
  );
};
