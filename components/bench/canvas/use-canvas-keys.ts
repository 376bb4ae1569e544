"use client";
import { useEffect, useEffectEvent, useRef } from "react";
import { useBenchContext, type Tool } from "@/components/bench/bench-store";
import { useDisplay } from "@/components/display/display-provider";
import { moveParts, removeParts, wholeGroups } from "@/lib/drawing/edit-parts";

const TYPES_INTO = "input, textarea, select, [contenteditable=true], [role=textbox], [role=combobox]";
const ON_TOP = "[role=dialog], [role=menu], [role=listbox]";

/** Single letters of the tools. */
export const TOOL_KEYS: Readonly<Record<string, Tool>> = {
  s: "select",
  p: "plate",
  o: "outline",
  h: "hole",
  t: "round",
  d: "dimension",
};

const ARROWS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

type Keys = Readonly<{ fit: () => void; zoom: (factor: number) => void; active: () => boolean }>;

/** Keys of the Bench where no field has focus; the ref tells whether the space bar is held (the hand moves the sheet). */
export const useCanvasKeys = ({ fit, zoom, active }: Keys) => {
  const { store, act } = useBenchContext();
  const { singleKeys } = useDisplay();
  const space = useRef(false);

  const used = (event: KeyboardEvent, onButton: boolean): boolean => {
    const { picked, grid } = store.getState();
    const arrow = ARROWS[event.key];
    if (arrow && !onButton && picked.length > 0) {
      const by = (grid || 1) * (event.shiftKey ? 10 : 1);
      act.edit((d) => moveParts(d, wholeGroups(d, picked), { x: arrow[0] * by, y: arrow[1] * by }));
      return true;
    }
    switch (event.key) {
      case " ":
        space.current = !onButton;
        return !onButton;
      case "Escape":
        if (store.getState().tool !== "select") act.use("select");
        else act.pick([]);
        return true;
      case "Delete":
      case "Backspace":
        if (picked.length === 0) return false;
        act.edit((d) => removeParts(d, picked));
        act.say(picked.length === 1 ? "1 part deleted" : `${picked.length} parts deleted`);
        return true;
    }
    if (!singleKeys) return false;
    switch (event.key) {
      case "0":
        fit();
        return true;
      case "+":
      case "=":
        zoom(1.25);
        return true;
      case "-":
        zoom(0.8);
        return true;
      case "g":
        act.set({ glass: !store.getState().glass });
        return true;
    }
    const tool = TOOL_KEYS[event.key.toLowerCase()];
    if (!tool) return false;
    act.use(tool);
    return true;
  };

  const onKey = useEffectEvent((event: KeyboardEvent) => {
    const target = event.target instanceof Element ? event.target : null;
    if (event.defaultPrevented || target?.closest(TYPES_INTO) || target?.closest(ON_TOP)) return;
    if (event.type === "keyup") {
      if (event.key === " ") space.current = false;
      return;
    }
    if (active()) return;
    const onButton = target?.closest("button, a, summary") !== null && target !== null;
    if (!event.ctrlKey && !event.metaKey && !event.altKey && used(event, onButton)) event.preventDefault();
  });

  useEffect(() => {
    window.addEventListener("keydown", onKey);
    window.addEventListener("keyup", onKey);
    return () => {
      window.removeEventListener("keydown", onKey);
      window.removeEventListener("keyup", onKey);
    };
  }, []);
  return space;
};
