"use client";
import { useEffect } from "react";
import { useQueryClient } from "@tanstack/react-query";
import { useBenchContext, type BenchState, type BenchStore } from "@/components/bench/bench-store";
import { api, ApiProblem } from "@/lib/client/api";
import { forgetJournal, UNSAVED, writeJournal } from "@/lib/client/journal";
import { queryKeys } from "@/lib/client/query-keys";
import type { DrawingRecord } from "@/lib/schemas/drawing";

const JOURNAL_AFTER_MS = 150;
const SAVE_AFTER_MS = 1_200;
const AGAIN_AFTER_MS = 4_000;

export const UNNAMED = "Untitled drawing";

type Content = Readonly<{ drawing: BenchState["history"]["now"]; name: string; of: BenchState["of"] }>;
const contentOf = (s: BenchState): Content => ({
  drawing: s.history.mark ?? s.history.now,
  name: s.name,
  of: s.of,
});
const same = (a: Content, b: Content) => a.drawing === b.drawing && a.name === b.name && a.of === b.of;

/**
 * Keeps the drawing: at once in the browser's journal, after a moment of rest on the server. When the server is away, the
 * session has ended, or somebody else saved first, the journal keeps it and the store says what is the matter.
 */
export const useAutosave = (owner: string): void => {
  const { store } = useBenchContext();
  const cache = useQueryClient();
  useEffect(() => {
    const saver = makeSaver(
      store,
      owner,
      () => void cache.invalidateQueries({ queryKey: queryKeys.drawings() }),
    );
    const stop = store.subscribe((now, before) => {
      if (!same(contentOf(now), contentOf(before))) saver.changed();
      // The shape it was saved as must not be lost to a quick reload.
      if (now.of !== before.of) saver.again();
      if (before.saveState.kind === "conflict" && now.saveState.kind === "waiting") saver.changed();
    });
    const onReturn = () => saver.again();
    window.addEventListener("online", onReturn);
    window.addEventListener("focus", onReturn);
    return () => {
      stop();
      saver.stop();
      window.removeEventListener("online", onReturn);
      window.removeEventListener("focus", onReturn);
    };
  }, [store, owner, cache]);
};

const makeSaver = (store: BenchStore, owner: string, onSaved: () => void) => {
  let kept = contentOf(store.getState());
  let journalTimer: ReturnType<typeof setTimeout> | undefined;
  let saveTimer: ReturnType<typeof setTimeout> | undefined;
  let underWay = false;
  let stopped = false;

  const key = () => store.getState().savedAs?.id ?? UNSAVED;
  const journal = async () => {
    const s = store.getState();
    const { drawing, name } = contentOf(s);
    const base = s.savedAs?.etag ?? null;
    try {
      await writeJournal(key(), { name, drawing, of: s.of, base, owner, at: new Date().toISOString() });
    } catch (cause) {
      console.warn("The browser's journal could not be written.", cause);
    }
  };
  const later = (ms: number) => {
    clearTimeout(saveTimer);
    if (!stopped) saveTimer = setTimeout(() => void save(), ms);
  };

  const save = async (): Promise<void> => {
    const s = store.getState();
    const content = contentOf(s);
    if (underWay || same(content, kept) || s.saveState.kind === "conflict") return;
    underWay = true;
    const fromKey = key();
    try {
      const saved = await send(s, content);
      kept = content;
      store.setState({
        savedAs: { id: saved.id, etag: saved.etag, at: saved.at },
        saveState: { kind: same(contentOf(store.getState()), content) ? "saved" : "waiting" },
      });
      if (fromKey === UNSAVED) window.history.replaceState(null, "", `/bench/${saved.id}`);
      if (same(contentOf(store.getState()), content) || fromKey === UNSAVED) await forgetJournal(fromKey);
      onSaved();
    } catch (cause) {
      await onRefused(store, cause);
      if (passing(cause)) later(AGAIN_AFTER_MS);
    } finally {
      underWay = false;
    }
    if (store.getState().saveState.kind === "waiting") later(SAVE_AFTER_MS);
  };

  return {
    changed: () => {
      const s = store.getState();
      if (s.saveState.kind === "saved" || s.saveState.kind === "unsaved" || s.saveState.kind === "refused")
        store.setState({ saveState: { kind: "waiting" } });
      clearTimeout(journalTimer);
      journalTimer = setTimeout(() => void journal(), JOURNAL_AFTER_MS);
      later(SAVE_AFTER_MS);
    },
    again: () => later(0),
    stop: () => {
      clearTimeout(journalTimer);
      if (!same(contentOf(store.getState()), kept)) {
        void journal();
        void save();
      }
      stopped = true;
      clearTimeout(saveTimer);
    },
  };
};

const passing = (cause: unknown) => cause instanceof ApiProblem && (cause.passing || cause.status === 429);

const send = async (s: BenchState, { drawing, name, of }: Content) => {
  const body = { name: name.trim() || UNNAMED, drawing, of };
  const answer = s.savedAs
    ? await api.patch<DrawingRecord>(`/drawings/${s.savedAs.id}`, { body, ifMatch: s.savedAs.etag })
    : await api.post<DrawingRecord>("/drawings", { body });
  return { id: answer.data.id, etag: answer.etag ?? "", at: answer.data.updatedAt };
};

const onRefused = async (store: BenchStore, cause: unknown): Promise<void> => {
  const since = new Date().toISOString();
  const { savedAs } = store.getState();
  if (!(cause instanceof ApiProblem)) throw cause;
  if (cause.status === 401) return store.setState({ saveState: { kind: "signed-out", since } });
  if (passing(cause)) return store.setState({ saveState: { kind: "away", since } });
  if (cause.stale && savedAs) {
    try {
      const theirs = await api.get<DrawingRecord>(`/drawings/${savedAs.id}`);
      return store.setState({
        saveState: {
          kind: "conflict",
          theirs: theirs.data.drawing,
          theirName: theirs.data.name,
          etag: theirs.etag ?? "",
          at: theirs.data.updatedAt,
        },
      });
    } catch (again) {
      if (!(again instanceof ApiProblem)) throw again;
      return store.setState({ saveState: { kind: "refused", sentence: again.message } });
    }
  }
  store.setState({ saveState: { kind: "refused", sentence: cause.message } });
};
