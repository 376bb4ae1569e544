"use client";
import { DeliveryList } from "@/components/goods-in/delivery-list";
import { UnloadPane } from "@/components/goods-in/unload-pane";
import { Sheet } from "@/components/sheet/sheet";
import { Cell, TitleBlock } from "@/components/sheet/title-block";
import { useDeliveries } from "@/lib/client/deliveries";
import type { Bay } from "@/lib/schemas/bay";
import type { DeliveryPage } from "@/lib/schemas/delivery";

type GoodsInScreenProps = Readonly<{ deliveries: DeliveryPage; bays: readonly Bay[] }>;

/** Where deliveries arrive: the list of them, and the place to unload the next. */
export function GoodsInScreen({ deliveries, bays }: GoodsInScreenProps) {
  const list = useDeliveries(deliveries);
  const items = list.data.pages.flatMap((page) => page.items);
  const open = items.filter((d) => d.state === "read").length;
  return (
    <Sheet
      heading="Goods-in"
      className="grid grid-cols-[minmax(0,1fr)_420px] max-lg:grid-cols-1 max-lg:grid-rows-[auto_auto]"
      block={
        <TitleBlock>
          <Cell label="Sheet" big>
            Goods-in
          </Cell>
          <Cell label="Deliveries" stays="md">
            {items.length}
            {list.hasNextPage && " and earlier ones"}
          </Cell>
          <Cell label="Waiting for a decision" fill>
            {open === 0 ? "none" : open}
          </Cell>
        </TitleBlock>
      }
    >
      <DeliveryList deliveries={items} more={list.hasNextPage} onMore={() => void list.fetchNextPage()} />
      <UnloadPane bays={bays} />
    </Sheet>
  );
}
