import type { Metadata } from "next";
import type { SearchParams } from "nuqs/server";
import { officePages } from "@/app/(desk)/office/pages";
import { pathWith } from "@/app/(desk)/path-with";
import { LogScreen } from "@/components/office/log-screen";
import { NoRightScreen } from "@/components/office/no-right-screen";
import { pageContext } from "@/lib/http/page-context";
import { couldEver } from "@/lib/permissions";
import { listBays } from "@/lib/services/bay/list";
import { listMembers } from "@/lib/services/member/list";
import { showOrganisation } from "@/lib/services/organisation/show";

export const metadata: Metadata = { title: "Log" };

type LogProps = Readonly<{ searchParams: Promise<SearchParams> }>;

export default async function LogPage({ searchParams }: LogProps) {
  const ctx = await pageContext(pathWith("/office/log", await searchParams));
  if (!couldEver(ctx.actor, "log.list")) {
    const [firm, bays] = await Promise.all([showOrganisation({ ctx }), listBays({ ctx })]);
    return <NoRightScreen name={ctx.actor.name} role={ctx.actor.role} firm={firm.name} bays={bays} />;
  }
  const { items } = await listMembers({ ctx });
  return (
    <LogScreen pages={officePages(ctx.actor)} people={items.map(({ userId, name }) => ({ userId, name }))} />
  );
}
