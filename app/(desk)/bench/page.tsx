import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { startFromCopy, startFromShape } from "@/app/(desk)/bench/start-from";
import { pathWith } from "@/app/(desk)/path-with";
import type { BenchStart } from "@/components/bench/bench-store";
import { BenchScreen } from "@/components/bench/bench-screen";
import { AppError } from "@/lib/errors";
import { pageContext } from "@/lib/http/page-context";

export const metadata: Metadata = { title: "Bench" };

type BenchPageProps = Readonly<{
  searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}>;

/**
 * A new sheet: empty, begun from a revision to make the next one (`?shape=…&revision=…`), or begun from a copy of one
 * (`?from=…&revision=…`).
 */
export default async function BenchPage({ searchParams }: BenchPageProps) {
  const params = await searchParams;
  const { shape, from, revision } = params;
  const ctx = await pageContext(pathWith("/bench", params));
  const person = { id: ctx.actor.userId, name: ctx.actor.name };
  const ordinal =
    typeof revision === "string" && /^[1-9]\d{0,8}$/.test(revision) ? Number(revision) : undefined;
  const start = async (): Promise<BenchStart> => {
    if (typeof shape === "string") return startFromShape(ctx, shape, ordinal);
    return typeof from === "string" ? startFromCopy(ctx, from, ordinal) : {};
  };
  const begun = await start().catch((error: unknown) => {
    if (error instanceof AppError && error.code === "notFound") notFound();
    throw error;
  });
  return <BenchScreen key={String(shape ?? from ?? "")} start={begun} person={person} />;
}
