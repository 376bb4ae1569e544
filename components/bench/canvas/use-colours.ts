"use client";
import { useEffect, useState, type RefObject } from "react";
import { coloursOf, type Colours } from "@/components/figure/figure-konva";

/** Colours and fonts of the theme in force, read again when the theme changes or the fonts arrive. */
export const useColours = (element: RefObject<HTMLElement | null>): Colours | null => {
  const [colours, setColours] = useState<Colours | null>(null);
  useEffect(() => {
    const read = () => element.current && setColours(coloursOf(element.current));
    read();
    void document.fonts.ready.then(read);
    const observer = new MutationObserver(read);
    observer.observe(document.documentElement, {
      attributes: true,
      attributeFilter: ["data-theme", "class"],
    });
    const print = window.matchMedia("print");
    print.addEventListener("change", read);
    return () => {
      observer.disconnect();
      print.removeEventListener("change", read);
    };
  }, [element]);
  return colours;
};
