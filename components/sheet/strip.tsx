import Link from "next/link";
import { AreaTabs } from "@/components/sheet/area-tabs";
import { BrandMark } from "@/components/sheet/brand";
import { FindField } from "@/components/sheet/find-field";
import { Person } from "@/components/sheet/person";

type StripProps = Readonly<{
  firm: string;
  person: Readonly<{ name: string; role: string }>;
}>;

/** The strip over the sheet. It is a row of the desk's grid; on a phone the tabs lie at the foot. */
export const Strip = ({ firm, person }: StripProps) => (
  <header className="no-print contents">
    <Link
      href="/"
      prefetch={false}
      className="flex items-center gap-[9px] pr-[22px] pl-3.5 text-[17px] font-[680] tracking-[-.005em] no-underline [grid-area:brand] max-lg:pr-2.5"
    >
      <BrandMark className="size-[22px]" />
      <span className="max-lg:sr-only max-sm:not-sr-only">Flitchbook</span>
    </Link>
    <AreaTabs className="[grid-area:tabs]" />
    <div className="flex min-w-0 items-center justify-end pr-3 [grid-area:who]">
      <FindField />
      <span className="mr-3 truncate text-table text-ink-2 max-lg:hidden">{firm}</span>
      <Person name={person.name} role={person.role} />
    </div>
  </header>
);
