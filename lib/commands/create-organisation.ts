import "server-only";
import { count, eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { log } from "@/db/schema/log";
import { memberships } from "@/db/schema/memberships";
import { organisations } from "@/db/schema/organisations";
import { users } from "@/db/schema/users";
import { hashPassword } from "@/lib/auth/password";
import { AppError } from "@/lib/errors";
import type { Actor, Role } from "@/lib/schemas/access";
import { newId } from "@/lib/services/new-id";

type FirstPerson = Readonly<{ email: string; name: string; role: Role; password: string }>;

type NewOrganisation = Readonly<{
  name: string;
  address?: string;
  /** The first is its admin; everybody signs in with the password given here. */
  people: readonly [FirstPerson, ...FirstPerson[]];
  now: number;
}>;

export const organisationCount = async (db: Db): Promise<number> =>
  (await db.read.select({ made: count() }).from(organisations))[0]?.made ?? 0;

/** Makes an organisation with its first members in one transaction: nobody could be asked for a right yet. An address in use is refused. */
export const createOrganisation = async (db: Db, wanted: NewOrganisation): Promise<readonly Actor[]> => {
  const organisationId = newId();
  const people = await Promise.all(
    wanted.people.map(async (person) => ({
      ...person,
      email: person.email.toLowerCase(),
      userId: newId(),
      membershipId: newId(),
      passwordHash: await hashPassword(person.password),
    })),
  );
  return db.write(async (tx) => {
    await tx.insert(organisations).values({
      id: organisationId,
      name: wanted.name,
      address: wanted.address ?? "",
      createdAt: wanted.now,
    });
    for (const { email, name, role, userId, membershipId, passwordHash } of people) {
      const [taken] = await tx.select({ id: users.id }).from(users).where(eq(users.email, email));
      if (taken) throw new AppError("conflict", { user: `There is an account for ${email} already.` });
      await tx.insert(users).values({ id: userId, email, name, passwordHash, createdAt: wanted.now });
      await tx
        .insert(memberships)
        .values({ id: membershipId, organisationId, userId, role, createdAt: wanted.now });
    }
    const [first] = people;
    await tx.insert(log).values({
      id: newId(),
      organisationId,
      at: wanted.now,
      actorId: first!.userId,
      actorName: first!.name,
      verb: "organisation.create",
      entity: "organisation",
      entityId: organisationId,
      subject: wanted.name,
      after: JSON.stringify({ name: wanted.name, members: people.length }),
      requestId: newId(),
    });
    return people.map(({ userId, membershipId, name, role }) => ({
      userId,
      membershipId,
      organisationId,
      name,
      role,
      rights: {},
      via: "command" as const,
    }));
  });
};
