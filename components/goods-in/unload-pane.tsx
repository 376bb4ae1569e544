"use client";
import { useRouter } from "next/navigation";
import { useEffect, useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { Notice } from "@/components/ui/notice";
import { SelectField } from "@/components/ui/select";
import { PaneHead } from "@/components/ui/table";
import { ProgressDimension } from "@/components/ui/waiting";
import { sentenceOf } from "@/lib/client/api";
import { bringIn } from "@/lib/client/deliveries";
import { MAX_CELL_CHARACTERS, MAX_COLUMNS, MAX_FILE_BYTES, MAX_ROWS } from "@/lib/intake/limits";
import type { Bay } from "@/lib/schemas/bay";

const KB = 1024;
const number = (n: number) => n.toLocaleString("en").replaceAll(",", "\u202f");

type UnloadPaneProps = Readonly<{ bays: readonly Bay[] }>;

/** Where a supplier's file is dropped or picked, the bay chosen, and the file sent with its progress. */
export function UnloadPane({ bays }: UnloadPaneProps) {
  const router = useRouter();
  const input = useRef<HTMLInputElement>(null);
  const stop = useRef<AbortController | null>(null);
  const [bayId, setBayId] = useState(bays.length === 1 ? (bays[0]?.id ?? "") : "");
  const [file, setFile] = useState<File | null>(null);
  const [over, setOver] = useState(false);
  const [sent, setSent] = useState<number | null>(null);
  const [trouble, setTrouble] = useState<string | null>(null);
  useEffect(() => () => stop.current?.abort(), []);

  const take = (next: File | null | undefined) => {
    setTrouble(null);
    if (!next) return;
    if (next.size > MAX_FILE_BYTES)
      setTrouble("The file is larger than 25 MB: split it and bring it in as two deliveries.");
    else if (next.size === 0) setTrouble("The file is empty: choose another.");
    else setFile(next);
  };
  const send = async () => {
    if (!file || bayId === "") return;
    const control = new AbortController();
    stop.current = control;
    setTrouble(null);
    setSent(0);
    try {
      const delivery = await bringIn({ file, bayId, onProgress: setSent, signal: control.signal });
      router.push(`/goods-in/${delivery.id}`);
    } catch (cause) {
      setTrouble(sentenceOf(cause));
      setSent(null);
    }
  };
  const missing = file === null ? "choose a file" : bayId === "" ? "choose a bay" : null;
  return (
    <section
      aria-label="Unload"
      className="flex min-h-0 flex-col border-l border-frame max-lg:border-t max-lg:border-l-0"
    >
      <PaneHead>Bring in a delivery</PaneHead>
      <div className="grid gap-4 overflow-y-auto p-4">
        <div
          onDragOver={(event) => {
            event.preventDefault();
            setOver(true);
          }}
          onDragLeave={() => setOver(false)}
          onDrop={(event) => {
            event.preventDefault();
            setOver(false);
            take(event.dataTransfer.files[0]);
          }}
          className={cx(
            "grid min-h-40 place-items-center border border-dashed px-4 py-6 text-center",
            over ? "border-2 border-oxide-ink bg-wash" : "border-edge",
          )}
        >
          <div>
            <p className="font-[640]">{file ? file.name : "Drop a supplier’s table here"}</p>
            <p className="mt-1 text-note text-ink-3">
              {file
                ? `${number(Math.ceil(file.size / KB))} kB`
                : "CSV, as it comes from the mill or the merchant"}
            </p>
            <Button className="mt-3" onClick={() => input.current?.click()} disabled={sent !== null}>
              {file ? "Choose another file" : "Choose a file"}
            </Button>
            <input
              ref={input}
              type="file"
              aria-label="File"
              accept=".csv,.txt,.tsv,text/csv,text/plain"
              className="sr-only"
              tabIndex={-1}
              onChange={(event) => {
                take(event.target.files?.[0]);
                event.target.value = "";
              }}
            />
          </div>
        </div>
        <SelectField
          label="Into bay"
          value={bayId}
          choices={[
            { value: "", label: "choose a bay", disabled: true },
            ...bays.map((bay) => ({
              value: bay.id,
              label: `${bay.ordinal} ${bay.name}`,
              disabled: bay.right !== "release",
            })),
          ]}
          onChange={setBayId}
          note="Shapes that a table brings are released there, checked by computation."
        />
        {sent !== null && file && (
          <ProgressDimension
            label="Sending"
            done={Math.ceil(sent / KB)}
            total={Math.ceil(file.size / KB)}
            unit="kB"
          />
        )}
        {trouble !== null && (
          <Notice kind="lost" head="The file was not kept.">
            {trouble}
          </Notice>
        )}
        <div className="flex flex-wrap items-center gap-3">
          <Button
            kind="main"
            onClick={send}
            disabled={missing !== null || sent !== null}
            atWork={sent !== null}
          >
            {missing === null ? "Unload" : `Unload: ${missing}`}
          </Button>
          {sent !== null && <Button onClick={() => stop.current?.abort()}>Stop</Button>}
        </div>
        <p className="text-note text-ink-3">
          At most {MAX_FILE_BYTES / KB / KB} MB, {number(MAX_ROWS)} rows, {MAX_COLUMNS} columns and{" "}
          {number(MAX_CELL_CHARACTERS)} characters a cell. Comma, semicolon, tab or pipe; decimal comma or
          point; UTF-8, UTF-16, or Windows-1252 once you have confirmed it. Nothing goes onto the Rack before
          you put it away.
        </p>
      </div>
    </section>
  );
}
