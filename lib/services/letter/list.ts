import "server-only";
import { desc, eq } from "drizzle-orm";
import { outbox } from "@/db/schema/outbox";
import { environment, isDemo } from "@/lib/env";
import { caughtLetters } from "@/lib/mail/fake-server";
import { mayAtAll } from "@/lib/permissions";
import type { LetterList } from "@/lib/schemas/letter";
import type { Ctx } from "../context";
import { iso, isoOrNull } from "../moments";

/** Letters of the organisation and how far they came; in the demo also the mailbox that catches them all. */
export const listLetters = async ({ ctx }: { ctx: Ctx }): Promise<LetterList> => {
  mayAtAll(ctx.actor, "letter.list");
  const rows = await ctx.db.read
    .select({
      id: outbox.id,
      to: outbox.to,
      subject: outbox.subject,
      state: outbox.state,
      failure: outbox.failure,
      createdAt: outbox.createdAt,
      sentAt: outbox.sentAt,
    })
    .from(outbox)
    .where(eq(outbox.organisationId, ctx.actor.organisationId))
    .orderBy(desc(outbox.createdAt), desc(outbox.id))
    .limit(200);
  const mailbox = isDemo() && environment().SMTP_URL === undefined ? await caughtLetters() : null;
  return {
    items: rows.map((row) => ({ ...row, createdAt: iso(row.createdAt), sentAt: isoOrNull(row.sentAt) })),
    mailbox: mailbox?.map((letter) => ({ ...letter, at: iso(letter.at) })) ?? null,
  };
};
