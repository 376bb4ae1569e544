import type { Metadata } from "next";
import { redirect } from "next/navigation";
import type { SearchParams } from "nuqs/server";
import { officePages } from "@/app/(desk)/office/pages";
import { pathWith } from "@/app/(desk)/path-with";
import { MembersScreen } from "@/components/office/members-screen";
import { NoRightScreen } from "@/components/office/no-right-screen";
import { pageContext } from "@/lib/http/page-context";
import { couldEver } from "@/lib/permissions";
import { listBays } from "@/lib/services/bay/list";
import { listLog } from "@/lib/services/log/list";
import { listMembers } from "@/lib/services/member/list";
import { showOrganisation } from "@/lib/services/organisation/show";

export const metadata: Metadata = { title: "Office" };

type OfficeProps = Readonly<{ searchParams: Promise<SearchParams> }>;

export default async function OfficePage({ searchParams }: OfficeProps) {
  const ctx = await pageContext(pathWith("/office", await searchParams));
  const pages = officePages(ctx.actor);
  const [firm, bays] = await Promise.all([showOrganisation({ ctx }), listBays({ ctx })]);
  if (!couldEver(ctx.actor, "member.list")) {
    const own = pages[0];
    if (own) redirect(own.href);
    return <NoRightScreen name={ctx.actor.name} role={ctx.actor.role} firm={firm.name} bays={bays} />;
  }
  const [members, log] = await Promise.all([listMembers({ ctx }), listLog({ ctx, input: { limit: "10" } })]);
  return (
    <MembersScreen
      pages={pages}
      firm={firm.name}
      self={ctx.actor.userId}
      now={ctx.now}
      members={members}
      bays={bays}
      log={log}
    />
  );
}
