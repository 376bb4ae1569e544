import type { Metadata } from "next";
import type { SearchParams } from "nuqs/server";
import { pathWith } from "@/app/(desk)/path-with";
import { CompareScreen } from "@/components/rack/compare-screen";
import { loadRackState, MAX_COMPARED } from "@/components/rack/search-params";
import { AppError } from "@/lib/errors";
import { pageContext } from "@/lib/http/page-context";
import type { ShapeSheet } from "@/lib/schemas/shape";
import { showShape } from "@/lib/services/shape/show";

export const metadata: Metadata = { title: "Compare" };

type ComparePageProps = Readonly<{ searchParams: Promise<SearchParams> }>;

export default async function ComparePage({ searchParams }: ComparePageProps) {
  const params = await searchParams;
  const ctx = await pageContext(pathWith("/rack/compare", params));
  const ids = [...new Set(loadRackState(params).with ?? [])].slice(0, MAX_COMPARED);
  const sheetOrNull = async (shapeId: string): Promise<ShapeSheet | null> => {
    try {
      return await showShape({ ctx, shapeId });
    } catch (error) {
      if (error instanceof AppError && error.code === "notFound") return null;
      throw error;
    }
  };
  const found = await Promise.all(ids.map(sheetOrNull));
  const sheets = found.filter((sheet) => sheet !== null);
  return <CompareScreen sheets={sheets} missing={found.length - sheets.length} />;
}
