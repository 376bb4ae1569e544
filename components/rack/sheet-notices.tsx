"use client";
import Link from "next/link";
import { When } from "@/components/display/when";
import type { SheetActionsProps } from "@/components/rack/sheet-actions";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { ApiProblem, sentenceOf } from "@/lib/client/api";

type SheetNoticesProps = SheetActionsProps & Readonly<{ onRefresh: () => void; failed: Error | null }>;

/** What stands against this revision: somebody was faster, it was sent back, superseded or withdrawn. */
export function SheetNotices({ sheet, life, onRefresh, failed }: SheetNoticesProps) {
  const { revision } = sheet;
  const stale = life.error instanceof ApiProblem && life.error.stale;
  const notices = [
    failed && (
      <Notice
        key="failed"
        kind="lost"
        head="What stands here may be old."
        actions={<Again onClick={onRefresh} />}
      >
        {sentenceOf(failed)}
      </Notice>
    ),
    stale && (
      <Notice
        key="stale"
        kind="conflict"
        head="Somebody changed this revision while you looked at it."
        actions={<Again onClick={() => (life.reset(), onRefresh())} label="Show its present state" />}
      >
        {life.error?.message} Nothing of yours was done; what stands below is the state you acted on.
      </Notice>
    ),
    life.isError && !stale && (
      <Notice key="refused" kind="lost" head="That did not happen.">
        {sentenceOf(life.error)}
      </Notice>
    ),
    revision.state === "draft" && revision.sentBack && (
      <Notice key="sent-back" kind="word" head={`${revision.sentBack.by.name} sent it back.`}>
        {revision.sentBack.reason}
      </Notice>
    ),
    revision.state === "superseded" && sheet.releasedOrdinal !== null && (
      <Notice
        key="superseded"
        kind="conflict"
        head={`Revision ${revision.letter} is superseded.`}
        actions={
          <Link className="link" href={`/rack/${sheet.id}`}>
            Open the released revision
          </Link>
        }
      >
        {revision.supersededAt && (
          <>
            Since <When at={revision.supersededAt} />; new pieces take the released one.
          </>
        )}
      </Notice>
    ),
    revision.withdrawn && (
      <Notice
        key="withdrawn"
        kind="conflict"
        head={`Withdrawn by ${revision.withdrawn.by.name}.`}
        actions={
          revision.withdrawn.replacement && (
            <Link className="link" href={`/rack/${revision.withdrawn.replacement.id}`}>
              Use {revision.withdrawn.replacement.designation} instead
            </Link>
          )
        }
      >
        {revision.withdrawn.reason}
      </Notice>
    ),
    sheet.workingOrdinal !== null && sheet.workingOrdinal > revision.ordinal && (
      <Notice
        key="working"
        kind="word"
        head="A newer revision is being worked on."
        actions={
          <Link className="link" href={`/rack/${sheet.id}?revision=${sheet.workingOrdinal}`}>
            Open it
          </Link>
        }
      />
    ),
  ].filter(Boolean);
  if (notices.length === 0) return null;
  return <div className="flex flex-none flex-col gap-2 border-b border-rule p-3">{notices}</div>;
}

const Again = ({ onClick, label = "Try again" }: { onClick: () => void; label?: string }) => (
  <Button size="small" className="no-print" onClick={onClick}>
    {label}
  </Button>
);
