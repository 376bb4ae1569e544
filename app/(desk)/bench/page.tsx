import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { startFromShape } from "@/app/(desk)/bench/start-from";
import { BenchScreen } from "@/components/bench/bench-screen";
import { AppError } from "@/lib/errors";
import { pageContext } from "@/lib/http/page-context";

export const metadata: Metadata = { title: "Bench" };

type BenchPageProps = Readonly<{
  searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}>;

/** A new sheet: empty, or begun from a revision of a shape (`?shape=…&revision=…`). */
export default async function BenchPage({ searchParams }: BenchPageProps) {
  const { shape, revision } = await searchParams;
  const wanted = typeof shape === "string" ? shape : null;
  const ctx = await pageContext(wanted ? `/bench?shape=${encodeURIComponent(wanted)}` : "/bench");
  const person = { id: ctx.actor.userId, name: ctx.actor.name };
  if (wanted === null) return <BenchScreen start={{}} person={person} />;
  const ordinal =
    typeof revision === "string" && /^[1-9]\d{0,8}$/.test(revision) ? Number(revision) : undefined;
  const start = await startFromShape(ctx, wanted, ordinal).catch((error: unknown) => {
    if (error instanceof AppError && error.code === "notFound") notFound();
    throw error;
  });
  return <BenchScreen key={wanted} start={start} person={person} />;
}
