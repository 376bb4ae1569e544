import type { Metadata } from "next";
import { GoodsInScreen } from "@/components/goods-in/goods-in-screen";
import { NoRight } from "@/components/goods-in/no-right";
import { pageContext } from "@/lib/http/page-context";
import { couldEver } from "@/lib/permissions";
import { listBays } from "@/lib/services/bay/list";
import { listDeliveries } from "@/lib/services/delivery/list";

export const metadata: Metadata = { title: "Goods-in" };

export default async function GoodsInPage() {
  const ctx = await pageContext("/goods-in");
  if (!couldEver(ctx.actor, "delivery.list")) return <NoRight />;
  const [deliveries, bays] = await Promise.all([listDeliveries({ ctx, input: {} }), listBays({ ctx })]);
  return <GoodsInScreen deliveries={deliveries} bays={bays.items} />;
}
