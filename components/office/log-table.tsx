"use client";
import { deedDetail, deedWord } from "@/components/office/deed-words";
import { Moment } from "@/components/office/moments";
import { Table, Td, Th } from "@/components/ui/table";
import type { LogEntry } from "@/lib/schemas/log";

type LogTableProps = Readonly<{ entries: readonly LogEntry[]; show: "time" | "both"; headed?: boolean }>;

const subjectOf = (entry: LogEntry) => {
  if (entry.subject === "" || entry.entity !== "shape") return entry.subject;
  return (
    <a href={`/rack/${entry.entityId}`} className="link">
      {entry.subject}
    </a>
  );
};

/** Deeds, newest first: when, who, on what, what, and the fields that changed. */
export const LogTable = ({ entries, show, headed }: LogTableProps) => (
  <Table>
    <caption className="sr-only">Deeds, newest first</caption>
    <thead className={headed ? "" : "sr-only"}>
      <tr>
        <Th className="pl-3.5!">When</Th>
        <Th>Who</Th>
        <Th>On what</Th>
        <Th>Deed</Th>
        <Th>Change</Th>
      </tr>
    </thead>
    <tbody>
      {entries.map((entry) => (
        <tr key={entry.id}>
          <Td className="h-[26px]! w-[84px] pl-3.5! font-num text-ink-2">
            <Moment at={entry.at} show={show} />
          </Td>
          <Td>{entry.actor.name}</Td>
          <Td>{subjectOf(entry)}</Td>
          <Td>{deedWord(entry.verb)}</Td>
          <Td className="max-w-[420px] truncate text-ink-2" title={deedDetail(entry)}>
            {deedDetail(entry)}
          </Td>
        </tr>
      ))}
    </tbody>
  </Table>
);
