import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import type { SearchParams } from "nuqs/server";
import { pathWith } from "@/app/(desk)/path-with";
import { ShapeSheetScreen } from "@/components/rack/shape-sheet-screen";
import { AppError } from "@/lib/errors";
import { etagOf } from "@/lib/http/version";
import { pageContext } from "@/lib/http/page-context";
import { showMe } from "@/lib/services/me/show";
import { showShape } from "@/lib/services/shape/show";

type ShapePageProps = Readonly<{
  params: Promise<Readonly<{ id: string }>>;
  searchParams: Promise<SearchParams>;
}>;

/** A revision's ordinal in the address; anything else means the one that counts. */
const ordinalIn = ({ revision }: SearchParams): number | undefined =>
  typeof revision === "string" && /^[1-9]\d{0,8}$/.test(revision) ? Number(revision) : undefined;

const load = cache(async (path: string, id: string, ordinal: number | undefined) => {
  const ctx = await pageContext(path);
  try {
    return { ctx, sheet: await showShape({ ctx, shapeId: id, ordinal }) };
  } catch (error) {
    if (error instanceof AppError && error.code === "notFound") notFound();
    throw error;
  }
});

const loadFor = async ({ params, searchParams }: ShapePageProps) => {
  const [{ id }, query] = [await params, await searchParams];
  return { ...(await load(pathWith(`/rack/${id}`, query), id, ordinalIn(query))), ordinal: ordinalIn(query) };
};

export async function generateMetadata(props: ShapePageProps): Promise<Metadata> {
  const { sheet } = await loadFor(props);
  return { title: `${sheet.designation} ${sheet.revision.letter}` };
}

export default async function ShapePage(props: ShapePageProps) {
  const { ctx, sheet, ordinal } = await loadFor(props);
  const me = await showMe({ ctx });
  return (
    <ShapeSheetScreen
      key={`${sheet.id} ${ordinal ?? ""}`}
      initial={{ sheet, etag: etagOf(sheet.version) }}
      revision={ordinal ?? null}
      firm={me.organisation.name}
      me={me.user}
    />
  );
}
