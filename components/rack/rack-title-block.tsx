"use client";
import Link from "next/link";
import { useDisplay } from "@/components/display/display-provider";
import { Count, UnitOf } from "@/components/display/quantity";
import { readSort, SORT_NAME, sortWords } from "@/components/rack/sort-names";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { Button, buttonClass } from "@/components/ui/button";
import { Kbd } from "@/components/ui/marks";
import { Menu, MenuChoice } from "@/components/ui/menu";
import { Arrow, ChevronSign } from "@/components/ui/signs";
import { apiUrl } from "@/lib/client/api";
import type { FinderRow } from "@/lib/schemas/find-shapes";

type RackTitleBlockProps = Readonly<{
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
  const { sort, onSort, rows, total, query, compared, rowsKnown, onForget, mayDraft } = props;
  const { settings } = useDisplay();
  const now = readSort(sort);
  const nowValue = now.falling ? `-${now.column}` : now.column;
  const names = compared.map(
    (id) => rowsKnown.find((row) => row.id === id)?.designation ?? "1 not in this list",
  );
  return (
    <TitleBlock>
      <Cell label="Sheet" big className="max-sm:hidden">
        The Rack
      </Cell>
      <Cell label="Order" stays="md">
        <Menu
          trigger={
            <button type="button" className="flex items-center gap-1.5 hover:underline">
              {sortWords(sort)} <ChevronSign />
            </button>
          }
        >
          <MenuChoice
            label="Order"
            value={nowValue}
            onChange={onSort}
            choices={ORDERS.filter((o) => OFTEN.has(o.value) || o.value === nowValue)}
          />
        </Menu>
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
        <Menu
          align="end"
          trigger={
            <Button kind="plain" className="px-[18px]" disabled={total === 0}>
              Export <ChevronSign />
            </Button>
          }
        >
          <ExportLinks query={query} />
        </Menu>
        {mayDraft && (
          <Link href="/bench" className={`${buttonClass({ kind: "main" })} px-[18px] max-sm:hidden`}>
            New shape on the Bench
          </Link>
        )}
      </ActionCell>
    </TitleBlock>
  );
}

/** All hits of the search, streamed by the server: full precision, in the units it stores. */
const ExportLinks = ({ query }: { query: Readonly<Record<string, string>> }) => (
  <div className="px-3 py-1">
    <p className="text-micro text-ink-2">All hits, full precision</p>
    <a className="link block py-1" href={apiUrl("/shapes/export.csv", query)} download>
      CSV, for spreadsheets and Goods-in
    </a>
    <a className="link block py-1" href={apiUrl("/shapes/export.json", query)} download>
      JSON, for programs
    </a>
    <p className="max-w-60 pt-1 text-note text-ink-3">
      Not checked: buckling, web bearing, connections, fatigue, fire, corrosion, the code’s factors. Local
      codes and a licensed engineer decide.
    </p>
  </div>
);
