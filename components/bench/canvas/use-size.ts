"use client";
import { useEffect, useState, type RefObject } from "react";

export type Size = Readonly<{ width: number; height: number }>;

/** Inner size of an element in whole px, kept up while it changes; null before the first measure. */
export const useSize = (element: RefObject<HTMLElement | null>): Size | null => {
  const [size, setSize] = useState<Size | null>(null);
  useEffect(() => {
    const target = element.current;
    if (!target) return;
    const observer = new ResizeObserver(([entry]) => {
      if (!entry) return;
      const width = Math.floor(entry.contentRect.width);
      const height = Math.floor(entry.contentRect.height);
      setSize((old) => (old?.width === width && old.height === height ? old : { width, height }));
    });
    observer.observe(target);
    return () => observer.disconnect();
  }, [element]);
  return size;
};
