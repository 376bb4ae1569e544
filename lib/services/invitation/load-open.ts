import "server-only";
import { and, eq, gt, isNull } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { invitations } from "@/db/schema/invitations";
import { organisations } from "@/db/schema/organisations";
import { users } from "@/db/schema/users";
import { hashSecret } from "@/lib/auth/secret";
import { AppError } from "@/lib/errors";

/** The open invitation a secret belongs to, with the account of its address if there is one. */
export const openInvitation = async (read: Pick<Reader | Tx, "select">, secret: string, now: number) => {
  const [row] = await read
    .select({
      invitation: invitations,
      organisation: organisations.name,
      user: { id: users.id, name: users.name, passwordHash: users.passwordHash },
    })
    .from(invitations)
    .innerJoin(organisations, eq(organisations.id, invitations.organisationId))
    .leftJoin(users, eq(users.email, invitations.email))
    .where(
      and(
        eq(invitations.hash, hashSecret(secret)),
        isNull(invitations.acceptedAt),
        isNull(invitations.revokedAt),
        gt(invitations.expiresAt, now),
      ),
    );
  if (!row) {
    throw new AppError("notFound", {
      user: "This invitation no longer holds: it was used, taken back, or is older than 72 hours. Ask for a new one.",
    });
  }
  return row;
};
