"use client";
import type { BenchState } from "@/components/bench/bench-store";
import type { Drawing } from "@/lib/drawing/schema";
import { readDrawing } from "@/lib/drawing/upgrade";
import { figuresText } from "@/lib/export/figures-text";
import { figureSvg } from "@/lib/export/svg";
import { sectionFigure } from "@/lib/figure/section-figure";

export const titleOf = (s: BenchState): string =>
  s.shape ? `${s.shape.designation}, revision ${s.shape.revision.letter}` : s.name || "Untitled drawing";

const fileName = (s: BenchState, ending: string) =>
  `${titleOf(s)
    .replace(/[^\p{L}\p{N} ._-]+/gu, "-")
    .slice(0, 80)}.${ending}`;

const offer = (content: string, type: string, name: string): void => {
  const address = URL.createObjectURL(new Blob([content], { type }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
};

const NOT_CHECKED =
  "Not checked: local, lateral and torsional-flexural buckling, web bearing, connections, fatigue, fire, corrosion, the code's factors. Local codes and a licensed engineer decide.";

/** What leaves the Bench: the drawing as JSON, figures as CSV or for the clipboard, the figure as SVG. */
export const handOver = {
  json: (s: BenchState) =>
    offer(JSON.stringify(s.history.now, null, 2), "application/json", fileName(s, "json")),
  csv: (s: BenchState) =>
    s.figures &&
    offer(figuresText(s.figures.properties, titleOf(s), ","), "text/csv;charset=utf-8", fileName(s, "csv")),
  svg: (s: BenchState, formatLength: (mm: number) => string) => {
    if (!s.figures) return;
    const [widthPx, heightPx] = [900, 640];
    const list = sectionFigure({
      drawing: s.history.now,
      section: s.figures.section,
      properties: s.figures.properties,
      fit: { widthPx, heightPx },
      formatLength,
    });
    const made = new Date().toISOString().slice(0, 10);
    const state = s.shape ? s.shape.revision.state : "private drawing";
    const captions = [`${titleOf(s)} · ${state} · ${made}`, NOT_CHECKED];
    offer(
      figureSvg({ list, widthPx, heightPx, title: titleOf(s), captions }),
      "image/svg+xml",
      fileName(s, "svg"),
    );
  },
  copyFigures: async (s: BenchState): Promise<void> => {
    if (s.figures) await navigator.clipboard.writeText(figuresText(s.figures.properties, titleOf(s), "\t"));
  },
};

/** A drawing read from text that was pasted or opened; null where it is none. */
export const drawingFromText = (text: string): Drawing | string => {
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch {
    return "That is not a drawing: it is no JSON.";
  }
  const read = readDrawing(json);
  return read.ok ? read.value : (read.error[0]?.detail ?? "That is not a drawing.");
};
