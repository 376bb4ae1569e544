import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import { startFromDrawing } from "@/app/(desk)/bench/start-from";
import { BenchScreen } from "@/components/bench/bench-screen";
import { AppError } from "@/lib/errors";
import { pageContext } from "@/lib/http/page-context";
import { showDrawing } from "@/lib/services/drawing/show";

type DrawingPageProps = Readonly<{ params: Promise<Readonly<{ id: string }>> }>;

const load = cache(async (id: string) => {
  const ctx = await pageContext(`/bench/${id}`);
  try {
    return { ctx, record: await showDrawing({ ctx, drawingId: id }) };
  } catch (error) {
    if (error instanceof AppError && error.code === "notFound") notFound();
    throw error;
  }
});

export async function generateMetadata({ params }: DrawingPageProps): Promise<Metadata> {
  const { record } = await load((await params).id);
  return { title: record.name };
}

export default async function DrawingPage({ params }: DrawingPageProps) {
  const { ctx, record } = await load((await params).id);
  return (
    <BenchScreen
      key={record.id}
      start={await startFromDrawing(ctx, record)}
      person={{ id: ctx.actor.userId, name: ctx.actor.name }}
    />
  );
}
