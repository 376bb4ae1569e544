"use client";
import { createContext, useContext, useMemo } from "react";
import { useStore } from "zustand";
import { createStore, type StoreApi } from "zustand/vanilla";
import type { BenchFigures } from "@/lib/client/compute/bench-figures";
import { newDrawing } from "@/lib/drawing/new-drawing";
import * as steps from "@/lib/drawing/history";
import type { History } from "@/lib/drawing/history";
import type { Drawing } from "@/lib/drawing/schema";
import type { Fault } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";
import type { View } from "@/lib/figure/view";
import type { RevisionItem, RevisionRecord } from "@/lib/schemas/shape";

export type Tool = "select" | "plate" | "round" | "outline" | "hole" | "dimension";

/** What this sheet is on the server: a private drawing, the shape it revises, and the state it was last saved in. */
export type SavedAs = Readonly<{ id: string; etag: string; at: string }>;

export type ShapeLink = Readonly<{
  id: string;
  designation: string;
  title: string;
  bayId: string;
  bayName: string;
  version: number;
  revision: Pick<RevisionItem, "ordinal" | "letter" | "state" | "version" | "checked"> &
    Readonly<{ may: RevisionRecord["may"]; properties: SectionProperties }>;
  /** What the revision holds, to tell whether the sheet differs from it. */
  drawing: Drawing;
}>;

export type SaveState =
  | Readonly<{ kind: "unsaved" | "waiting" | "saved" }>
  | Readonly<{ kind: "away" | "signed-out"; since: string }>
  | Readonly<{ kind: "refused"; sentence: string }>
  | Readonly<{ kind: "conflict"; theirs: Drawing; theirName: string; etag: string; at: string }>;

export type Pinned = Readonly<{ name: string; properties: SectionProperties }>;

export type BenchState = Readonly<{
  name: string;
  savedAs: SavedAs | null;
  of: Readonly<{ shapeId: string; ordinal: number }> | null;
  shape: ShapeLink | null;
  saveState: SaveState;
  history: History<Drawing>;
  /** Parts in hand, in the order they were picked. */
  picked: readonly string[];
  hovered: string | null;
  moving: readonly string[];
  tool: Tool;
  figures: BenchFigures | null;
  /** The drawing the figures belong to: older than what is drawn while they are being computed. */
  figuresOf: Drawing | null;
  faults: readonly Fault[];
  engineFault: string | null;
  pinned: Pinned | null;
  grid: number;
  snapping: boolean;
  glass: boolean;
  view: View | null;
  /** Spoken by the live region. */
  said: string;
}>;

export type BenchStore = StoreApi<BenchState>;

export type BenchStart = Readonly<
  Partial<Pick<BenchState, "name" | "savedAs" | "of" | "shape">> & { drawing?: Drawing }
>;

export const makeBenchStore = (start: BenchStart): BenchStore =>
  createStore<BenchState>(() => ({
    name: start.name ?? "",
    savedAs: start.savedAs ?? null,
    of: start.of ?? null,
    shape: start.shape ?? null,
    saveState: { kind: start.savedAs ? "saved" : "unsaved" },
    history: steps.startHistory(start.drawing ?? newDrawing()),
    picked: [],
    hovered: null,
    moving: [],
    tool: "select",
    figures: null,
    figuresOf: null,
    faults: [],
    engineFault: null,
    pinned: null,
    grid: 1,
    snapping: true,
    glass: false,
    view: null,
    said: "",
  }));

const present = (picked: readonly string[], drawing: Drawing) => {
  const ids = new Set(drawing.parts.map((p) => p.id));
  return picked.every((id) => ids.has(id)) ? picked : picked.filter((id) => ids.has(id));
};

const step = (change: (h: History<Drawing>) => History<Drawing>) => (s: BenchState) => {
  const history = change(s.history);
  return history === s.history ? s : { history, picked: present(s.picked, history.now) };
};

/** What the screen does to the store; each finished change is one step of the history. */
export const benchActions = (store: BenchStore) => {
  const { setState, getState } = store;
  return {
    drawing: () => getState().history.now,
    edit: (change: (drawing: Drawing) => Drawing) =>
      setState(step((h) => steps.record(steps.commit(h), change(steps.commit(h).now)))),
    beginGesture: (moving: readonly string[] = []) => {
      setState(step(steps.mark));
      setState({ moving });
    },
    preview: (drawing: Drawing) => setState(step((h) => steps.preview(h, drawing))),
    endGesture: () => {
      setState(step(steps.commit));
      setState({ moving: [] });
    },
    bail: () => {
      setState(step(steps.bail));
      setState({ moving: [] });
    },
    undo: () => setState(step(steps.undo)),
    redo: () => setState(step(steps.redo)),
    pick: (picked: readonly string[]) => setState({ picked }),
    togglePick: (id: string) =>
      setState((s) => ({
        picked: s.picked.includes(id) ? s.picked.filter((p) => p !== id) : [...s.picked, id],
      })),
    hover: (hovered: string | null) => getState().hovered !== hovered && setState({ hovered }),
    use: (tool: Tool) => setState({ tool }),
    say: (said: string) => setState({ said }),
    set: (change: Partial<BenchState>) => setState(change),
  };
};

export type BenchActions = ReturnType<typeof benchActions>;

type Bench = Readonly<{ store: BenchStore; act: BenchActions }>;
export const BenchContext = createContext<Bench | null>(null);

export const useBenchContext = (): Bench => {
  const bench = useContext(BenchContext);
  if (!bench) throw new Error("useBench is used outside the Bench");
  return bench;
};

export const useBench = <T>(select: (state: BenchState) => T): T => useStore(useBenchContext().store, select);
export const useBenchActions = (): BenchActions => useBenchContext().act;
/** Number of each part in the table by its id; the same map until parts come, go or change places. */
export const useItems = (): ReadonlyMap<string, number> => {
  const ids = useBench((s) => s.history.now.parts.map((p) => p.id).join(" "));
  return useMemo(() => new Map(ids.split(" ").map((id, i) => [id, i + 1])), [ids]);
};
