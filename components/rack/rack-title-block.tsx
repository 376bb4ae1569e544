"use client";
import Link from "next/link";
import { useDisplay } from "@/components/display/display-provider";
import { Count, UnitOf } from "@/components/display/quantity";
import { readSort, SORT_NAME } from "@/components/rack/sort-names";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { buttonClass } from "@/components/ui/button";
import { Kbd } from "@/components/ui/marks";
import { Select } from "@/components/ui/select";
import { Arrow } from "@/components/ui/signs";
import { apiUrl } from "@/lib/client/api";
import { useWaiting } from "@/lib/client/waiting";
import type { FinderRow } from "@/lib/schemas/find-shapes";

type RackTitleBlockProps = Readonly<{
  /** On a phone the areas lie at the foot; the block would only take room. */
  phone: boolean;
  sort: string;
  onSort: (sort: string) => void;
  rows: number;
  total: number | null;
  query: Readonly<Record<string, string>>;
  compared: readonly string[];
  rowsKnown: readonly FinderRow[];
  onForget: () => void;
  mayDraft: boolean;
}>;

const ORDERS = Object.entries(SORT_NAME).flatMap(([column, [rising, falling]]) => [
  { value: column, label: rising },
  { value: `-${column}`, label: falling },
]);
const OFTEN = new Set(["mass", "-SxPerMass", "-Sx", "-Ix", "depth", "designation", "-jobs"]);

export function RackTitleBlock(props: RackTitleBlockProps) {
  const { phone, sort, onSort, rows, total, query, compared, rowsKnown, onForget, mayDraft } = props;
  const { settings } = useDisplay();
  const toCheck = useWaiting().data?.toCheck ?? 0;
  const now = readSort(sort);
  const nowValue = now.falling ? `-${now.column}` : now.column;
  const names = compared.map(
    (id) => rowsKnown.find((row) => row.id === id)?.designation ?? "1 not in this list",
  );
  if (phone) return null;
  return (
    <TitleBlock>
      <Cell label="Sheet" big className="max-sm:hidden">
        The Rack
      </Cell>
      <Cell label="Order" stays="md">
        <Select
          aria-label="Order"
          value={nowValue}
          onChange={onSort}
          choices={ORDERS.filter((o) => OFTEN.has(o.value) || o.value === nowValue)}
          className="-ml-1.5 h-5! w-[190px] border-transparent bg-transparent"
        />
      </Cell>
      <Cell label="Rows" className="max-sm:hidden">
        {total === null ? (
          "·····"
        ) : total === 0 ? (
          "none"
        ) : (
          <>
            1 to <Count value={rows} /> of <Count value={total} />
          </>
        )}
      </Cell>
      <Cell label="Keys" fill stays="xl">
        <span className="inline-flex items-center gap-1">
          <Kbd>
            <Arrow to="up" />
          </Kbd>
          <Kbd>
            <Arrow to="down" />
          </Kbd>{" "}
          move <Kbd>Enter</Kbd> open <Kbd>C</Kbd> compare
        </span>
      </Cell>
      {compared.length > 0 && (
        <Cell label="To compare" className="max-w-[340px] max-sm:hidden">
          <Link href={`/rack/compare?with=${compared.join(",")}`} className="link">
            {names.join(", ")}
          </Link>{" "}
          <button type="button" className="text-note text-ink-2 hover:underline" onClick={onForget}>
            put back
          </button>
        </Cell>
      )}
      <Cell label="Units" stays="lg">
        {settings.system === "metric" ? "mm" : "in"}, <UnitOf property="mass" />
      </Cell>
      <span className="min-w-0 flex-1 xl:hidden" />
      <ActionCell>
        {toCheck > 0 && (
          <Link
            prefetch={false}
            href="/rack/to-check"
            className={`${buttonClass({ kind: "plain" })} px-[18px] text-oxide-ink max-md:hidden`}
          >
            {toCheck} to check
          </Link>
        )}
        {total !== 0 && (
          <>
            <a
              className={`${buttonClass({ kind: "plain" })} px-[18px] max-sm:hidden`}
              href={apiUrl("/shapes/export.csv", query)}
              title="all hits, full precision, in the units they are stored in"
              download
            >
              Export CSV
            </a>
            <a
              className={`${buttonClass({ kind: "plain" })} px-3 max-md:hidden`}
              href={apiUrl("/shapes/export.json", query)}
              download
            >
              JSON
            </a>
          </>
        )}
        {mayDraft && (
          <Link
            prefetch={false}
            href="/bench"
            className={`${buttonClass({ kind: "main" })} px-[18px] max-sm:hidden`}
          >
            New shape on the Bench
          </Link>
        )}
      </ActionCell>
    </TitleBlock>
  );
}
