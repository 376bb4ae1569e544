import Link from "next/link";
import { Sheet } from "@/components/sheet/sheet";
import { Cell, TitleBlock } from "@/components/sheet/title-block";
import { buttonClass } from "@/components/ui/button";
import { EmptyBay } from "@/components/ui/empty-bay";

/** For designers and engineers: what they may do, and who does the rest. */
export const NoRight = () => (
  <Sheet
    heading="Goods-in"
    block={
      <TitleBlock>
        <Cell label="Sheet" big fill>
          Goods-in
        </Cell>
      </TitleBlock>
    }
  >
    <EmptyBay
      head="Deliveries are taken in by librarians and admins."
      actions={
        <Link href="/rack" className={buttonClass()}>
          Open the Rack
        </Link>
      }
    >
      What they put away is on the Rack for you to use. A size that is missing there: ask a librarian to bring
      its table in, or draw it on the Bench.
    </EmptyBay>
  </Sheet>
);
