import type { Metadata } from "next";
import { officePages } from "@/app/(desk)/office/pages";
import { FirmScreen } from "@/components/office/firm-screen";
import { NoRightScreen } from "@/components/office/no-right-screen";
import { pageContext } from "@/lib/http/page-context";
import { couldEver } from "@/lib/permissions";
import { listBays } from "@/lib/services/bay/list";
import { showOrganisation } from "@/lib/services/organisation/show";

export const metadata: Metadata = { title: "Firm" };

export default async function FirmPage() {
  const ctx = await pageContext("/office/firm");
  const firm = await showOrganisation({ ctx });
  if (!couldEver(ctx.actor, "organisation.update")) {
    const bays = await listBays({ ctx });
    return <NoRightScreen name={ctx.actor.name} role={ctx.actor.role} firm={firm.name} bays={bays} />;
  }
  return <FirmScreen pages={officePages(ctx.actor)} firm={firm} />;
}
