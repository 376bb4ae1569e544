import { expect, test } from "vitest";
import {
  baysWith,
  couldEver,
  may,
  mayAtAll,
  requireRight,
  rightIn,
  VERBS,
  type Verb,
} from "@/lib/permissions";
import { ROLES, type Actor, type Role } from "@/lib/schemas/access";

const actor = (role: Role, rights: Actor["rights"] = {}): Actor => ({
  userId: "u",
  membershipId: "m",
  organisationId: "o",
  name: "N",
  role,
  rights,
  via: "session",
});

test("the role gives the right in every bay: designer reads, engineer drafts, librarian and admin release", () => {
  expect(ROLES.map((role) => rightIn(actor(role), "b"))).toEqual(["read", "draft", "release", "release"]);
});

test("a grant in one bay counts there before one for the whole Rack, and that before the role", () => {
  const engineer = actor("engineer", { all: "release", b1: "read" });
  expect(rightIn(engineer, "b1")).toBe("read");
  expect(rightIn(engineer, "b2")).toBe("release");
});

test("a designer raised in one bay may draft there and nowhere else", () => {
  const raised = actor("designer", { b1: "draft" });
  expect(couldEver(raised, "shape.create")).toBe(true);
  expect(may(raised, "shape.create", "b1")).toBe(true);
  expect(may(raised, "shape.create", "b2")).toBe(false);
  expect(() => requireRight(raised, "shape.create", "b2")).toThrow(/Ask an admin/);
  expect(baysWith(raised, "draft")).toEqual({ elsewhere: false, except: [], also: ["b1"] });
});

test("a librarian lowered to reading in one bay cannot release there but everywhere else", () => {
  const lowered = actor("librarian", { b1: "read" });
  expect(may(lowered, "revision.release", "b1")).toBe(false);
  expect(may(lowered, "revision.release", "b2")).toBe(true);
  expect(baysWith(lowered, "release")).toEqual({ elsewhere: true, except: ["b1"], also: [] });
});

test("a grant never opens what a role guards", () => {
  const granted = actor("designer", { all: "release" });
  for (const verb of ["member.update", "right.put", "log.list", "delivery.putAway", "bay.create"] as const) {
    expect(() => mayAtAll(granted, verb), verb).toThrow(/This is for/);
  }
});

test("what only admins may do is refused to the three other roles", () => {
  const adminOnly = (Object.keys(VERBS) as Verb[]).filter((verb) => {
    const ask = VERBS[verb];
    return "roles" in ask && ask.roles.length === 1;
  });
  expect(adminOnly.length).toBeGreaterThan(8);
  for (const verb of adminOnly) {
    expect(ROLES.filter((role) => couldEver(actor(role), verb))).toEqual(["admin"]);
  }
});
