import "server-only";
import { inArray } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { users } from "@/db/schema/users";
import type { Person } from "@/lib/schemas/common";

/** Names of people by id, for answers of the organisation they acted in; ids come from its own rows. */
export const peopleOf = async (
  read: Pick<Reader | Tx, "select">,
  ids: readonly (string | null)[],
): Promise<(id: string | null) => Person> => {
  const wanted = [...new Set(ids.filter((id) => id !== null))];
  const rows =
    wanted.length === 0
      ? []
      : await read.select({ id: users.id, name: users.name }).from(users).where(inArray(users.id, wanted));
  const byId = new Map(rows.map((row) => [row.id, row]));
  return (id) => (id !== null ? byId.get(id) : undefined) ?? { id: id ?? "", name: "somebody" };
};
