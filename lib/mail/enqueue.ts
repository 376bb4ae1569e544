import "server-only";
import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { outbox } from "@/db/schema/outbox";

export type Letter = Readonly<{ organisationId: string | null; to: string; subject: string; text: string }>;

/** Lays a letter into the outbox, in the transaction of the deed it tells of: both are kept or neither. */
export const enqueueLetter = async (tx: Tx, letter: Letter, now: number): Promise<void> => {
  await tx.insert(outbox).values({ ...letter, id: uuidv7(), nextAt: now, createdAt: now });
};
