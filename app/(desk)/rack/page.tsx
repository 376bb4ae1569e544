import type { Metadata } from "next";
import type { SearchParams } from "nuqs/server";
import { RackScreen } from "@/components/rack/rack-screen";
import { loadRackState, queryOf, searchOf } from "@/components/rack/search-params";
import { pageContext } from "@/lib/http/page-context";
import { couldEver } from "@/lib/permissions";
import { listBays } from "@/lib/services/bay/list";
import { findShapes } from "@/lib/services/shape/find";
import { pathWith } from "@/app/(desk)/path-with";

export const metadata: Metadata = { title: "Rack" };

type RackPageProps = Readonly<{ searchParams: Promise<SearchParams> }>;

export default async function RackPage({ searchParams }: RackPageProps) {
  const params = await searchParams;
  const ctx = await pageContext(pathWith("/rack", params));
  const query = queryOf(searchOf(loadRackState(params)));
  const input = { ...query, limit: "60", include: "counts,drawing" };
  const [first, bays] = await Promise.all([findShapes({ ctx, input }), listBays({ ctx })]);
  return (
    <RackScreen
      first={first}
      firstQuery={query}
      bays={bays}
      mayDraft={couldEver(ctx.actor, "shape.create")}
      mayDeliver={couldEver(ctx.actor, "delivery.create")}
    />
  );
}
