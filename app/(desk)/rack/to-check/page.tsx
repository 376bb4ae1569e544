import type { Metadata } from "next";
import { CheckListScreen } from "@/components/rack/check-list-screen";
import { pageContext } from "@/lib/http/page-context";
import { listBays } from "@/lib/services/bay/list";
import { findShapes } from "@/lib/services/shape/find";

export const metadata: Metadata = { title: "To check" };

export default async function ToCheckPage() {
  const ctx = await pageContext("/rack/to-check");
  const input = { state: "submitted", include: "drawing", limit: "60", sort: "designation" };
  const [rows, bays] = await Promise.all([findShapes({ ctx, input }), listBays({ ctx })]);
  return (
    <CheckListScreen rows={rows} bays={bays.items} me={{ id: ctx.actor.userId, name: ctx.actor.name }} />
  );
}
