import "server-only";
import { and, eq } from "drizzle-orm";
import type { Db, Tx } from "@/db/client";
import { jobs } from "@/db/schema/jobs";
import { Actor } from "@/lib/schemas/access";
import { newId } from "../new-id";

export const JOB_KINDS = ["delivery.read", "delivery.putAway"] as const;
export type JobKind = (typeof JOB_KINDS)[number];

/** How long a job may be silent before another process may take it over. */
export const LEASE_MS = 30_000;
/** A job that ended its process this often is not tried again by itself. */
export const MAX_ATTEMPTS = 3;

export type Job = Readonly<{
  id: string;
  organisationId: string;
  kind: JobKind;
  deliveryId: string;
  actor: Actor;
  requestId: string;
}>;

type NewJob = Readonly<{ kind: JobKind; deliveryId: string; actor: Actor; requestId: string; now: number }>;

/** Writes down that something is to be done, in the transaction that decides it. */
export const addJob = async (
  tx: Tx,
  { kind, deliveryId, actor, requestId, now }: NewJob,
): Promise<string> => {
  const id = newId();
  await tx.insert(jobs).values({
    id,
    organisationId: actor.organisationId,
    kind,
    subjectId: deliveryId,
    state: "waiting",
    payload: JSON.stringify({ actor, requestId }),
    createdAt: now,
    updatedAt: now,
  });
  return id;
};

export const loadJob = async (db: Db, id: string): Promise<Job> => {
  const [row] = await db.read.select().from(jobs).where(eq(jobs.id, id));
  const kind = JOB_KINDS.find((k) => k === row?.kind);
  if (row === undefined || kind === undefined) throw new Error(`job ${id} is not known`);
  const payload = JSON.parse(row.payload) as { actor: unknown; requestId: string };
  return {
    id,
    organisationId: row.organisationId,
    kind,
    deliveryId: row.subjectId,
    actor: Actor.parse(payload.actor),
    requestId: payload.requestId,
  };
};

/** Inside the job's own transactions: extends the lease, reports progress. @returns whether somebody asked it to stop. */
export const beat = async (tx: Tx, jobId: string, progress: number): Promise<boolean> => {
  const now = Date.now();
  await tx
    .update(jobs)
    .set({ progress: Math.min(1, Math.max(0, progress)), leaseUntil: now + LEASE_MS, updatedAt: now })
    .where(eq(jobs.id, jobId));
  const [row] = await tx.select({ stopAsked: jobs.stopAsked }).from(jobs).where(eq(jobs.id, jobId));
  return row?.stopAsked ?? true;
};

export const endJob = (tx: Tx, jobId: string, state: "done" | "failed" | "stopped", failure = "") =>
  tx
    .update(jobs)
    .set({
      state,
      failure,
      leaseUntil: null,
      leaseHolder: null,
      updatedAt: Date.now(),
      ...(state === "done" ? { progress: 1 } : {}),
    })
    .where(and(eq(jobs.id, jobId)));
