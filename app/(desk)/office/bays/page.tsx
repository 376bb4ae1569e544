import type { Metadata } from "next";
import { officePages } from "@/app/(desk)/office/pages";
import { BaysScreen } from "@/components/office/bays-screen";
import { NoRightScreen } from "@/components/office/no-right-screen";
import { pageContext } from "@/lib/http/page-context";
import { couldEver } from "@/lib/permissions";
import { listBays } from "@/lib/services/bay/list";
import { showOrganisation } from "@/lib/services/organisation/show";

export const metadata: Metadata = { title: "Bays" };

export default async function BaysPage() {
  const ctx = await pageContext("/office/bays");
  const [firm, bays] = await Promise.all([showOrganisation({ ctx }), listBays({ ctx })]);
  if (!couldEver(ctx.actor, "bay.update"))
    return <NoRightScreen name={ctx.actor.name} role={ctx.actor.role} firm={firm.name} bays={bays} />;
  return <BaysScreen pages={officePages(ctx.actor)} firm={firm.name} bays={bays} />;
}
