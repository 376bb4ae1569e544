"use client";
import Link from "next/link";
import { useState } from "react";
import { CheckDialog } from "@/components/rack/check-dialog";
import { SendBackDialog } from "@/components/rack/send-back-dialog";
import { WithdrawDialog } from "@/components/rack/withdraw-dialog";
import { ActionCell } from "@/components/sheet/title-block";
import { Button, buttonClass } from "@/components/ui/button";
import type { useLifeStep } from "@/lib/client/revisions";
import type { ShapeSheet } from "@/lib/schemas/shape";

export type SheetActionsProps = Readonly<{ sheet: ShapeSheet; life: ReturnType<typeof useLifeStep> }>;

/** What may be done with the revision shown, by right and state; the server asks again. One of them is the main one. */
export function SheetActions({ sheet, life }: SheetActionsProps) {
  const { revision } = sheet;
  const { may, state } = revision;
  const [open, setOpen] = useState<"check" | "send-back" | "withdraw" | null>(null);
  const close = () => setOpen(null);
  const bench = `/bench?shape=${sheet.id}&revision=${revision.ordinal}`;
  const mainClass = `${buttonClass({ kind: "main" })} px-[18px]`;
  const mainRelease = may.release;
  return (
    <>
      <ActionCell>
        {may.withdraw && (
          <Button kind="plain" className="px-[18px]" onClick={() => setOpen("withdraw")}>
            Withdraw
          </Button>
        )}
        {may.sendBack && (
          <Button kind="plain" className="px-[18px]" onClick={() => setOpen("send-back")}>
            Send back
          </Button>
        )}
        <Button kind="plain" className="px-[18px] max-md:hidden" onClick={() => window.print()}>
          Print
        </Button>
        {may.edit && (
          <Link
            prefetch={false}
            href={bench}
            className={may.submit ? `${buttonClass({ kind: "plain" })} px-[18px] max-sm:hidden` : mainClass}
          >
            Edit on the Bench
          </Link>
        )}
        {may.check && (
          <Button
            kind={mainRelease ? "plain" : "main"}
            className="px-[18px]"
            onClick={() => setOpen("check")}
          >
            Check revision {revision.letter}
          </Button>
        )}
        {may.submit && (
          <Button
            kind="main"
            className="px-[18px]"
            atWork={life.isPending}
            onClick={() => life.mutate({ step: "submit" })}
          >
            Submit for release
          </Button>
        )}
        {mainRelease && (
          <Button
            kind="main"
            className="px-[18px]"
            atWork={life.isPending}
            onClick={() => life.mutate({ step: "release" })}
          >
            Release
          </Button>
        )}
        {state !== "draft" && may.revise && !mainRelease && !may.check && (
          <Link prefetch={false} href={bench} className={`${mainClass} max-sm:hidden`}>
            Revise on the Bench
          </Link>
        )}
        {!may.revise && !may.edit && !may.check && !mainRelease && (
          <Link
            prefetch={false}
            href={`/bench?shape=${sheet.id}&revision=${revision.ordinal}`}
            className={`${mainClass} max-sm:hidden`}
          >
            Copy to Bench
          </Link>
        )}
      </ActionCell>
      <CheckDialog open={open === "check"} onClose={close} sheet={sheet} life={life} />
      <SendBackDialog open={open === "send-back"} onClose={close} sheet={sheet} life={life} />
      <WithdrawDialog open={open === "withdraw"} onClose={close} sheet={sheet} life={life} />
    </>
  );
}
