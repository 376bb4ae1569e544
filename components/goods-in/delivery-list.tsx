"use client";
import Link from "next/link";
import { Count } from "@/components/display/quantity";
import { DateText } from "@/components/goods-in/date-text";
import { stateWords } from "@/components/goods-in/state-words";
import { VerdictBar } from "@/components/goods-in/verdict-bar";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { EmptyBay } from "@/components/ui/empty-bay";
import { Table, Td, Th, Tr } from "@/components/ui/table";
import type { DeliverySummary } from "@/lib/schemas/delivery";

type DeliveryListProps = Readonly<{
  deliveries: readonly DeliverySummary[];
  more: boolean;
  onMore: () => void;
}>;

/** The deliveries, newest first; each is a link to where it stands. */
export function DeliveryList({ deliveries, more, onMore }: DeliveryListProps) {
  if (deliveries.length === 0)
    return (
      <EmptyBay head="No delivery yet.">
        Bring in a supplier’s table of sizes. Every row is drawn from its dimensions, computed, and held
        against the figures printed beside them before it goes onto the Rack.
      </EmptyBay>
    );
  return (
    <div className="min-h-0 overflow-auto">
      <Table aria-label="Deliveries">
        <thead className="sticky top-0 bg-panel">
          <tr>
            <Th>Delivery</Th>
            <Th>File</Th>
            <Th className="max-md:hidden">Into bay</Th>
            <Th numeric className="max-sm:hidden">
              Rows
            </Th>
            <Th className="max-md:hidden">Verdicts</Th>
            <Th>State</Th>
            <Th className="max-lg:hidden">Brought by</Th>
          </tr>
        </thead>
        <tbody>
          {deliveries.map((d) => (
            <Tr key={d.id} className="hover:[&>td]:bg-wash">
              <Td className="h-9">
                <Link href={`/goods-in/${d.id}`} className="link font-num font-[560]">
                  {d.code}
                </Link>
              </Td>
              <Td className="max-w-[260px] truncate max-sm:max-w-[130px]">{d.fileName}</Td>
              <Td className="max-md:hidden">{d.bay.name}</Td>
              <Td numeric className="max-sm:hidden">
                {d.counts && <Count value={d.counts.rows} />}
              </Td>
              <Td className="max-md:hidden">
                {d.counts && d.counts.rows > 0 && <VerdictBar counts={d.counts} />}
              </Td>
              <Td
                className={cx(d.state === "failed" || (d.counts?.undecided ?? 0) > 0 ? "text-oxide-ink" : "")}
              >
                {stateWords(d)}
              </Td>
              <Td className="text-ink-2 max-lg:hidden">
                {d.createdBy.name}, <DateText iso={d.createdAt} />
              </Td>
            </Tr>
          ))}
        </tbody>
      </Table>
      {more && (
        <div className="p-3">
          <Button onClick={onMore}>Earlier deliveries</Button>
        </div>
      )}
    </div>
  );
}
