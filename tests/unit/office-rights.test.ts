import { describe, expect, test } from "vitest";
import { changesFor, rightInBay } from "@/components/office/member-rights";
import type { Grant, Member } from "@/lib/schemas/member";

const NOW = Date.parse("2026-03-12T12:00:00Z");
const grant = (bayId: string | null, right: Grant["right"], until: string | null = null): Grant => ({
  bayId,
  right,
  until,
  grantedBy: { id: "u", name: "J. Harrow" },
  at: "2026-01-01T00:00:00Z",
});
const engineer = (...grants: Grant[]): Pick<Member, "id" | "role" | "grants"> => ({
  id: "m",
  role: "engineer",
  grants,
});
const wish = { bayId: "b1", right: "release", everywhere: false, until: null } as const;

describe("the right that counts in a bay", () => {
  test("is the role's where nothing was granted", () => {
    expect(rightInBay(engineer(), "b1", NOW)).toMatchObject({ right: "draft", from: "role" });
  });
  test("is the bay's grant before the Rack's, and the Rack's before the role's", () => {
    const member = engineer(grant(null, "read"), grant("b1", "release"));
    expect(rightInBay(member, "b1", NOW)).toMatchObject({ right: "release", from: "bay", inherited: "read" });
    expect(rightInBay(member, "b2", NOW)).toMatchObject({ right: "read", from: "rack" });
  });
  test("falls back when the grant has ended", () => {
    const member = engineer(grant("b1", "release", "2026-03-12T11:59:59Z"));
    expect(rightInBay(member, "b1", NOW)).toMatchObject({ right: "draft", from: "role" });
  });
});

describe("the changes that make a wish true", () => {
  test("grant what the role does not give", () => {
    expect(changesFor(engineer(), wish, NOW)).toEqual([
      { memberId: "m", bayId: "b1", right: "release", until: null },
    ]);
  });
  test("take the grant away when the role gives it anyway", () => {
    const member = engineer(grant("b1", "release"));
    expect(changesFor(member, { ...wish, right: "draft" }, NOW)).toEqual([
      { memberId: "m", bayId: "b1", right: null, until: null },
    ]);
  });
  test("are none when nothing would differ", () => {
    expect(changesFor(engineer(), { ...wish, right: "draft" }, NOW)).toEqual([]);
  });
  test("in all bays replace every single grant by one for the Rack", () => {
    const member = engineer(grant("b1", "read"), grant("b2", "release"));
    expect(changesFor(member, { ...wish, everywhere: true }, NOW)).toEqual([
      { memberId: "m", bayId: null, right: "release", until: null },
      { memberId: "m", bayId: "b1", right: null, until: null },
      { memberId: "m", bayId: "b2", right: null, until: null },
    ]);
  });
});
