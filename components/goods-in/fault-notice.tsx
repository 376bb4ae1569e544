"use client";
import { useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Detail } from "@/components/goods-in/words";
import { sentenceOf } from "@/lib/client/api";
import { sendFile, sendReading, useDeliveryDeed } from "@/lib/client/deliveries";
import { useQueryClient } from "@tanstack/react-query";
import { queryKeys } from "@/lib/client/query-keys";
import type { Delivery } from "@/lib/schemas/delivery";

/** Why a file was given back, with its place; an encoding is confirmed on sample lines, or another file takes its place. */
export function FaultNotice({ delivery }: Readonly<{ delivery: Delivery }>) {
  const input = useRef<HTMLInputElement>(null);
  const cache = useQueryClient();
  const [trouble, setTrouble] = useState<string | null>(null);
  const confirm = useDeliveryDeed(delivery.id, sendReading(delivery.id));
  const { fault } = delivery;
  if (fault === null) return null;
  const replace = async (file: File | undefined) => {
    if (!file) return;
    setTrouble(null);
    try {
      const next = await sendFile(delivery, {
        file,
        onProgress: () => undefined,
        signal: new AbortController().signal,
      });
      cache.setQueryData(queryKeys.delivery(delivery.id), next);
    } catch (cause) {
      setTrouble(sentenceOf(cause));
    }
  };
  const place =
    fault.line === undefined
      ? ""
      : `Line ${fault.line}${fault.column === undefined ? "" : `, position ${fault.column}`}. `;
  const givenBack = delivery.state === "failed" || delivery.state === "stopped";
  return (
    <Notice
      kind="lost"
      head={givenBack ? "The file was given back." : "It was not put away."}
      className="border-b border-rule p-4"
      actions={
        givenBack && (
          <>
            {fault.code === "encoding.confirm" &&
              (["windows-1252", "windows-1250"] as const).map((encoding) => (
                <Button
                  key={encoding}
                  disabled={confirm.isPending}
                  onClick={() => confirm.mutate({ input: { encoding }, version: delivery.version })}
                >
                  Read as {encoding === "windows-1252" ? "Windows-1252" : "Windows-1250"}
                </Button>
              ))}
            <Button onClick={() => input.current?.click()}>Bring another file</Button>
            <input
              ref={input}
              type="file"
              aria-label="Another file"
              className="sr-only"
              tabIndex={-1}
              onChange={(event) => void replace(event.target.files?.[0])}
            />
            {(trouble ?? (confirm.isError ? sentenceOf(confirm.error) : null)) && (
              <span role="alert" className="text-oxide-ink">
                {trouble ?? sentenceOf(confirm.error)}
              </span>
            )}
          </>
        )
      }
    >
      {place}
      <Detail text={fault.detail} />
      {fault.samples !== undefined && fault.samples.length > 0 && (
        <span className="mt-2 block border-l-2 border-edge pl-3 font-num text-table text-ink">
          {fault.samples.map((line, i) => (
            <span key={i} className="block truncate">
              {line}
            </span>
          ))}
        </span>
      )}
    </Notice>
  );
}
