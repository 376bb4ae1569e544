"use client";
import { useEffect, useState } from "react";
import { useBench, useBenchActions, useBenchContext } from "@/components/bench/bench-store";
import { savedWhen } from "@/components/bench/drawings-dialog";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { forgetJournal, readJournal, UNSAVED, type JournalEntry } from "@/lib/client/journal";

/** What stands between the sheet and the server, said calmly: what is safe, and what to do. */
export const SaveNotices = ({ owner }: { owner: string }) => {
  const act = useBenchActions();
  const state = useBench((s) => s.saveState);
  const found = useUnsaved(owner);
  return (
    <div className="empty:hidden [&>div]:border-b [&>div]:border-frame [&>div]:px-3 [&>div]:py-1.5">
      {found.entry && (
        <Notice
          kind="word"
          head={`There is a state of ${savedWhen(found.entry.at)} that the server never got.`}
          actions={
            <>
              <Button size="small" onClick={found.bringBack}>
                Bring it back
              </Button>
              <Button size="small" onClick={found.drop}>
                Drop it
              </Button>
            </>
          }
        >
          It was kept in this browser: {found.entry.drawing.parts.length} parts.
        </Notice>
      )}
      {state.kind === "away" && (
        <Notice kind="word" head="The server does not answer.">
          Everything is kept in this browser since {savedWhen(state.since)} and saved by itself when it is
          back.
        </Notice>
      )}
      {state.kind === "signed-out" && (
        <Notice
          kind="conflict"
          head="Your session has ended."
          actions={
            <Button size="small" asChild>
              <a href={`/sign-in?next=${encodeURIComponent(window.location.pathname)}`}>Sign in</a>
            </Button>
          }
        >
          What you draw is kept in this browser; sign in again, here or in another window, and it is saved.
        </Notice>
      )}
      {state.kind === "refused" && (
        <Notice kind="lost" head="Not saved.">
          {state.sentence} The drawing is kept in this browser.
        </Notice>
      )}
      {state.kind === "conflict" && (
        <Notice
          kind="conflict"
          head={`This drawing was saved in another window at ${savedWhen(state.at)}.`}
          actions={
            <>
              <Button
                size="small"
                onClick={() => {
                  act.edit(() => state.theirs);
                  act.set({ name: state.theirName });
                  rebase(state.etag, state.at);
                }}
              >
                Take that state ({state.theirs.parts.length} parts)
              </Button>
              <Button size="small" onClick={() => rebase(state.etag, state.at)}>
                Keep this one
              </Button>
            </>
          }
        >
          Both are there: undo brings back the one you did not choose.
        </Notice>
      )}
    </div>
  );

  function rebase(etag: string, at: string) {
    const id = found.savedId();
    if (id) act.set({ savedAs: { id, etag, at }, saveState: { kind: "waiting" } });
  }
};

/** A journal entry of this drawing that the server has not got. */
const useUnsaved = (owner: string) => {
  const { store, act } = useBenchContext();
  const [entry, setEntry] = useState<JournalEntry | null>(null);
  const key = () => store.getState().savedAs?.id ?? UNSAVED;
  useEffect(() => {
    const at = store.getState().savedAs?.id ?? UNSAVED;
    let gone = false;
    readJournal(at).then(
      (found) => {
        const { history } = store.getState();
        if (gone || !found || found.owner !== owner || history.past.length > 0) return;
        if (JSON.stringify(found.drawing) !== JSON.stringify(history.now) && found.drawing.parts.length > 0)
          setEntry(found);
      },
      (cause: unknown) => console.warn("The browser's journal could not be read.", cause),
    );
    return () => {
      gone = true;
    };
  }, [store, owner]);
  return {
    entry,
    savedId: () => store.getState().savedAs?.id ?? null,
    bringBack: () => {
      if (!entry) return;
      act.edit(() => entry.drawing);
      if (entry.name) act.set({ name: entry.name });
      setEntry(null);
    },
    drop: () => {
      void forgetJournal(key());
      setEntry(null);
    },
  };
};
