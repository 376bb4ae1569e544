"use client";
import { useEffect, useEffectEvent } from "react";
import { useDisplay } from "@/components/display/display-provider";

const TYPES_INTO = "input, textarea, select, [contenteditable=true], [role=textbox], [role=combobox]";
const ON_TOP = "[role=dialog], [role=menu], [role=listbox]";

/**
 * A key that acts on the whole sheet: only where no field has focus, nothing lies on top, and no modifier is held.
 * Single letters can be switched off in the person's menu; named keys (Enter, arrows) cannot.
 */
export function useShortcut(key: string, act: (event: KeyboardEvent) => void, enabled = true): void {
  const { singleKeys } = useDisplay();
  const on = enabled && (singleKeys || key.length > 1);
  const run = useEffectEvent(act);
  useEffect(() => {
    if (!on) return;
    const onKey = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.altKey || event.ctrlKey || event.metaKey) return;
      if (event.key.toLowerCase() !== key.toLowerCase()) return;
      const target = event.target instanceof Element ? event.target : null;
      if (target?.closest(TYPES_INTO) || target?.closest(ON_TOP)) return;
      run(event);
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, [key, on]);
}
