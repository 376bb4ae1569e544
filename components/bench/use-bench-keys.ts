"use client";
import { useEffect, useEffectEvent } from "react";
import { useBenchContext } from "@/components/bench/bench-store";
import { drawingFromText } from "@/components/bench/hand-over";
import { arrayParts } from "@/lib/drawing/arrange-parts";
import { clipOf, pasteClip } from "@/lib/drawing/clip";
import { removeParts } from "@/lib/drawing/edit-parts";

const TYPES_INTO =
  "input, textarea, select, [contenteditable=true], [role=textbox], [role=combobox], [role=dialog], [role=menu]";
const inField = (event: Event) =>
  event.target instanceof Element && event.target.closest(TYPES_INTO) !== null;

/** A pasted copy lies a little aside of where it came from. */
const ASIDE = { x: 20, y: -20 };

/** Undo, redo, copy, cut, paste, duplicate, all: with Ctrl or Cmd, where no field has focus. */
export const useBenchKeys = (): void => {
  const { store, act } = useBenchContext();
  const onKey = useEffectEvent((event: KeyboardEvent) => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey || inField(event)) return;
    const { picked, history } = store.getState();
    const key = event.key.toLowerCase();
    if (key === "z" && !event.shiftKey) act.undo();
    else if (key === "y" || (key === "z" && event.shiftKey)) act.redo();
    else if (key === "a") act.pick(history.now.parts.map((p) => p.id));
    else if (key === "d" && picked.length > 0) {
      const made = arrayParts(history.now, picked, 1, ASIDE);
      act.edit(() => made.drawing);
      act.pick(made.ids);
    } else return;
    event.preventDefault();
  });
  const onCopy = useEffectEvent((event: ClipboardEvent) => {
    const { picked, history } = store.getState();
    const selection = window.getSelection()?.toString() ?? "";
    if (inField(event) || picked.length === 0 || selection !== "") return;
    event.clipboardData?.setData("text/plain", JSON.stringify(clipOf(history.now, picked)));
    event.preventDefault();
    act.say(picked.length === 1 ? "1 part copied" : `${picked.length} parts copied`);
    if (event.type === "cut") act.edit((d) => removeParts(d, picked));
  });
  const onPaste = useEffectEvent((event: ClipboardEvent) => {
    if (inField(event)) return;
    const text = event.clipboardData?.getData("text/plain") ?? "";
    if (!text.trim().startsWith("{")) return;
    event.preventDefault();
    const read = drawingFromText(text);
    if (typeof read === "string") return act.say(read);
    const pasted = pasteClip(act.drawing(), read, ASIDE);
    act.edit(() => pasted.drawing);
    act.pick(pasted.ids);
    act.say(`${pasted.ids.length} parts pasted`);
  });
  useEffect(() => {
    window.addEventListener("keydown", onKey);
    document.addEventListener("copy", onCopy);
    document.addEventListener("cut", onCopy);
    document.addEventListener("paste", onPaste);
    return () => {
      window.removeEventListener("keydown", onKey);
      document.removeEventListener("copy", onCopy);
      document.removeEventListener("cut", onCopy);
      document.removeEventListener("paste", onPaste);
    };
  }, []);
};
