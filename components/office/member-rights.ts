import { RIGHT_OF_ROLE } from "@/lib/permissions";
import type { Right, Role } from "@/lib/schemas/access";
import type { Grant, Member } from "@/lib/schemas/member";

export const RIGHT_WORDS: Record<Right, string> = {
  read: "read only",
  draft: "draft and submit",
  release: "release and withdraw",
};

export type RightInBay = Readonly<{
  right: Right;
  /** Where it comes from: the role, a grant for the whole Rack, or a grant for this bay. */
  from: "role" | "rack" | "bay";
  /** What would count without a grant for this bay. */
  inherited: Right;
  until: string | null;
}>;

const holds = (grant: Grant, now: number) => grant.until === null || Date.parse(grant.until) > now;

/** The right that counts in a bay: granted there, else for the whole Rack, else by the role. */
export const rightInBay = (
  member: Pick<Member, "role" | "grants">,
  bayId: string,
  now: number,
): RightInBay => {
  const grants = member.grants.filter((grant) => holds(grant, now));
  const here = grants.find((grant) => grant.bayId === bayId);
  const rack = grants.find((grant) => grant.bayId === null);
  const inherited = rack?.right ?? RIGHT_OF_ROLE[member.role];
  if (here) return { right: here.right, from: "bay", inherited, until: here.until };
  if (rack) return { right: rack.right, from: "rack", inherited, until: rack.until };
  return { right: inherited, from: "role", inherited, until: null };
};

export type RightChange = Readonly<{
  memberId: string;
  bayId: string | null;
  right: Right | null;
  until: string | null;
}>;

type Wish = Readonly<{ bayId: string; right: Right; everywhere: boolean; until: string | null }>;

/** The changes that make a wish true: what the role (or the Rack's grant) gives anyway needs no grant. */
export const changesFor = (
  member: Pick<Member, "id" | "role" | "grants">,
  wish: Wish,
  now: number,
): readonly RightChange[] => {
  const change = (bayId: string | null, right: Right | null, until: string | null = null): RightChange => ({
    memberId: member.id,
    bayId,
    right,
    until: right === null ? null : until,
  });
  if (!wish.everywhere) {
    const { inherited, from } = rightInBay(member, wish.bayId, now);
    const needless = wish.right === inherited && wish.until === null;
    if (needless && from !== "bay") return [];
    return [change(wish.bayId, needless ? null : wish.right, wish.until)];
  }
  const byRole = RIGHT_OF_ROLE[member.role as Role] === wish.right && wish.until === null;
  const single = member.grants
    .filter((grant) => grant.bayId !== null)
    .map((grant) => change(grant.bayId, null));
  const whole = member.grants.some((grant) => grant.bayId === null);
  if (byRole) return whole ? [change(null, null), ...single] : single;
  return [change(null, wish.right, wish.until), ...single];
};
