"use client";
import { useState } from "react";
import { When } from "@/components/display/when";
import { Button } from "@/components/ui/button";
import { TextArea } from "@/components/ui/field";
import { PaneHead } from "@/components/ui/table";
import { sentenceOf } from "@/lib/client/api";
import { useAddComment, useComments, useDeeds } from "@/lib/client/comments";

/** What people said about a shape, oldest first. */
export function Comments({ shapeId }: { shapeId: string }) {
  const comments = useComments(shapeId);
  const add = useAddComment(shapeId);
  const [text, setText] = useState("");
  return (
    <section aria-label="Comments" className="no-print">
      <PaneHead className="border-t border-frame">Comments</PaneHead>
      {comments.isError && (
        <p className="px-3 py-1.5 text-note text-oxide-ink">{sentenceOf(comments.error)}</p>
      )}
      <ul>
        {comments.data?.map((comment) => (
          <li key={comment.id} className="border-b border-rule px-3 py-1.5 text-table">
            <p className="text-note text-ink-3">
              <b className="text-ink-2">{comment.by.name}</b>, <When at={comment.at} minute />
            </p>
            <p className="break-words whitespace-pre-wrap">{comment.text}</p>
          </li>
        ))}
      </ul>
      <form
        className="px-3 py-2"
        onSubmit={(event) => {
          event.preventDefault();
          if (text.trim()) add.mutate(text.trim(), { onSuccess: () => setText("") });
        }}
      >
        <TextArea
          label="Say something about it"
          rows={2}
          maxLength={2000}
          value={text}
          onChange={(event) => setText(event.target.value)}
          error={add.isError ? sentenceOf(add.error) : null}
        />
        {text.trim() && (
          <Button type="submit" size="small" atWork={add.isPending} className="mt-1.5">
            Add the comment
          </Button>
        )}
      </form>
    </section>
  );
}

/** What was done to a shape, by whom and when, from the log; fetched when it is opened. */
export function Deeds({ shapeId }: { shapeId: string }) {
  const [open, setOpen] = useState(false);
  const deeds = useDeeds(shapeId, open);
  return (
    <details
      className="no-print border-t border-frame"
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary className="flex min-h-8 items-center bg-panel px-3 font-[640] hover:bg-wash max-md:min-h-11">
        Deeds
        <span className="ml-2 text-note font-regular text-ink-3">what was done, by whom, when</span>
      </summary>
      {deeds.isError && <p className="px-3 py-1.5 text-note text-oxide-ink">{sentenceOf(deeds.error)}</p>}
      {deeds.isFetching && <p className="px-3 py-1.5 text-note text-ink-3">asking the log</p>}
      <ol>
        {deeds.data?.map((deed) => (
          <li key={deed.id} className="border-b border-rule px-3 py-1 text-table">
            <span className="text-ink-3">
              <When at={deed.at} minute />
            </span>{" "}
            <b className="font-[560]">{deed.by}</b> {deed.verb}{" "}
            <span className="text-ink-2">{deed.detail}</span>
          </li>
        ))}
      </ol>
    </details>
  );
}
