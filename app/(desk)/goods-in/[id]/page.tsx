import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { DeliveryScreen } from "@/components/goods-in/delivery-screen";
import { NoRight } from "@/components/goods-in/no-right";
import { AppError } from "@/lib/errors";
import { pageContext } from "@/lib/http/page-context";
import { couldEver } from "@/lib/permissions";
import { showDelivery } from "@/lib/services/delivery/show";

export const metadata: Metadata = { title: "Delivery" };

type DeliveryPageProps = Readonly<{ params: Promise<{ id: string }> }>;

export default async function DeliveryPage({ params }: DeliveryPageProps) {
  const { id } = await params;
  const ctx = await pageContext(`/goods-in/${id}`);
  if (!couldEver(ctx.actor, "delivery.show")) return <NoRight />;
  const delivery = await showDelivery({ ctx, deliveryId: id }).catch((error: unknown) => {
    if (error instanceof AppError && error.code === "notFound") notFound();
    throw error;
  });
  return <DeliveryScreen initial={delivery} />;
}
