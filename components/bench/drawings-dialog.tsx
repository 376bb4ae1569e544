"use client";
import Link from "next/link";
import { useState } from "react";
import { useBench } from "@/components/bench/bench-store";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { fieldClass } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Table, Td, Th } from "@/components/ui/table";
import { sentenceOf } from "@/lib/client/api";
import { useDrawingDeeds, useDrawings } from "@/lib/client/drawings";
import type { DrawingItem } from "@/lib/schemas/drawing";

export const savedWhen = (iso: string): string => {
  const at = new Date(iso);
  const today = at.toDateString() === new Date().toDateString();
  return today
    ? at.toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit" })
    : at.toLocaleDateString("en-GB", { day: "numeric", month: "short", year: "numeric" });
};

/** One's own drawings: opened, renamed, copied, deleted and brought back. */
export const DrawingsDialog = ({ onClose }: { onClose: () => void }) => {
  const list = useDrawings();
  const deeds = useDrawingDeeds();
  const here = useBench((s) => s.savedAs?.id);
  const [gone, setGone] = useState<DrawingItem | null>(null);
  const refused = deeds.rename.error ?? deeds.duplicate.error ?? deeds.remove.error ?? deeds.restore.error;
  const items = list.data?.items ?? [];
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Your drawings"
      text="Private to you until you save one into a bay."
      width="wide"
      actions={<Button onClick={() => window.location.assign("/bench")}>New drawing</Button>}
    >
      {refused && <Notice kind="lost" head={sentenceOf(refused)} className="mb-2" />}
      {list.isError && <Notice kind="lost" head={sentenceOf(list.error)} className="mb-2" />}
      {gone && (
        <Notice
          kind="word"
          head={`"${gone.name}" is deleted.`}
          className="mb-2"
          actions={
            <Button
              size="small"
              onClick={() => deeds.restore.mutate(gone.id, { onSuccess: () => setGone(null) })}
            >
              Bring it back
            </Button>
          }
        />
      )}
      {list.isSuccess && items.length === 0 && (
        <p className="text-ink-2">No drawing yet: what you draw is kept here.</p>
      )}
      {items.length > 0 && (
        <Table>
          <thead>
            <tr>
              <Th>Name</Th>
              <Th numeric>Parts</Th>
              <Th>Saved</Th>
              <Th>
                <span className="sr-only">Deeds</span>
              </Th>
            </tr>
          </thead>
          <tbody>
            {items.map((item) => (
              <tr key={item.id}>
                <Td className="w-full px-1">
                  <input
                    aria-label={`Name of ${item.name}`}
                    defaultValue={item.name}
                    key={`${item.id}-${item.version}`}
                    maxLength={120}
                    onKeyDown={(e) => e.key === "Enter" && e.currentTarget.blur()}
                    onBlur={(e) => {
                      const name = e.target.value.trim();
                      if (name && name !== item.name) deeds.rename.mutate({ item, name });
                    }}
                    disabled={item.id === here}
                    className={`${fieldClass({ locked: item.id === here })} h-6 w-full text-table max-md:h-11`}
                  />
                </Td>
                <Td numeric>{item.parts}</Td>
                <Td>{savedWhen(item.updatedAt)}</Td>
                <Td>
                  <span className="flex gap-1">
                    <Button size="small" asChild>
                      <Link
                        prefetch={false}
                        href={`/bench/${item.id}`}
                        onClick={onClose}
                        aria-label={`Open ${item.name}`}
                      >
                        open
                      </Link>
                    </Button>
                    <Button
                      size="small"
                      aria-label={`Copy ${item.name}`}
                      onClick={() => deeds.duplicate.mutate(item)}
                    >
                      copy
                    </Button>
                    <Button
                      size="small"
                      aria-label={`Delete ${item.name}`}
                      disabled={item.id === here}
                      title={item.id === here ? "It is open" : undefined}
                      onClick={() => deeds.remove.mutate(item, { onSuccess: () => setGone(item) })}
                    >
                      delete
                    </Button>
                  </span>
                </Td>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
    </Dialog>
  );
};
