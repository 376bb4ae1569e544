import { AppError } from "@/lib/errors";
import { RIGHTS, ROLES, type Actor, type Right, type Role } from "@/lib/schemas/access";

type Ask =
  | Readonly<{ public: true }>
  | Readonly<{ signedIn: true }>
  | Readonly<{ roles: readonly Role[] }>
  | Readonly<{ inBay: Right }>;

const anyone = { public: true } as const;
const signedIn = { signedIn: true } as const;
const keepers = { roles: ["librarian", "admin"] } as const;
const admin = { roles: ["admin"] } as const;
const read = { inBay: "read" } as const;
const draft = { inBay: "draft" } as const;
const release = { inBay: "release" } as const;

/** What each verb asks. The only place that names roles and rights; a verb without an entry does not exist. */
export const VERBS = {
  "health.show": anyone,
  "health.ready": anyone,
  "openapi.show": anyone,
  "api.unknown": anyone,
  "session.open": anyone,
  "session.show": signedIn,
  "session.close": anyone,
  "session.list": signedIn,
  "session.end": signedIn,
  "me.show": signedIn,
  "me.update": signedIn,
  "me.changePassword": signedIn,
  "passwordReset.request": anyone,
  "passwordReset.complete": anyone,
  "organisation.show": signedIn,
  "organisation.update": admin,
  "properties.compute": signedIn,
  "drawing.list": signedIn,
  "drawing.create": signedIn,
  "drawing.show": signedIn,
  "drawing.update": signedIn,
  "drawing.delete": signedIn,
  "drawing.restore": signedIn,
  "drawing.duplicate": signedIn,
  "shape.find": read,
  "shape.export": read,
  "shape.show": read,
  "shape.figure": read,
  "shape.create": draft,
  "shape.update": draft,
  "shape.editTabulated": keepers,
  "shape.deeds": read,
  "shape.uses": read,
  "shape.tag": draft,
  "revision.list": read,
  "revision.show": read,
  "revision.create": draft,
  "revision.update": draft,
  "revision.discard": draft,
  "revision.submit": draft,
  "revision.check": draft,
  "revision.sendBack": draft,
  "revision.release": release,
  "revision.withdraw": release,
  "revision.compare": read,
  "work.waiting": signedIn,
  "take.list": read,
  "take.create": read,
  "take.delete": read,
  "comment.list": read,
  "comment.create": read,
  "comment.delete": read,
  "savedSearch.list": signedIn,
  "savedSearch.create": signedIn,
  "savedSearch.update": signedIn,
  "savedSearch.delete": signedIn,
  "bay.list": signedIn,
  "bay.create": keepers,
  "bay.update": keepers,
  "bay.delete": keepers,
  "delivery.list": keepers,
  "delivery.create": keepers,
  "delivery.show": keepers,
  "delivery.putFile": keepers,
  "delivery.rows": keepers,
  "delivery.decide": keepers,
  "delivery.putReading": keepers,
  "delivery.putAway": keepers,
  "delivery.return": keepers,
  "delivery.stop": keepers,
  "delivery.delete": keepers,
  "reading.list": keepers,
  "reading.create": keepers,
  "reading.update": keepers,
  "reading.delete": keepers,
  "member.list": admin,
  "member.update": admin,
  "member.endSessions": admin,
  "right.list": admin,
  "right.put": admin,
  "rightRequest.list": signedIn,
  "rightRequest.listAll": admin,
  "rightRequest.create": signedIn,
  "rightRequest.decide": admin,
  "invitation.list": admin,
  "invitation.create": admin,
  "invitation.revoke": admin,
  "invitation.show": anyone,
  "invitation.accept": anyone,
  "token.list": signedIn,
  "token.create": signedIn,
  "token.revoke": signedIn,
  "token.manageAll": admin,
  "letter.list": admin,
  "log.list": admin,
  "log.export": admin,
} as const satisfies Record<string, Ask>;

export type Verb = keyof typeof VERBS;

export const RIGHT_OF_ROLE = {
  designer: "read",
  engineer: "draft",
  librarian: "release",
  admin: "release",
} as const satisfies Record<Role, Right>;

const rank = (right: Right): number => RIGHTS.indexOf(right);

/** The right that counts in a bay: granted there, else granted for the whole Rack, else given by the role. */
export const rightIn = (actor: Actor, bayId: string): Right =>
  actor.rights[bayId] ?? actor.rights.all ?? RIGHT_OF_ROLE[actor.role];

export const atLeast = (right: Right, needed: Right): boolean => rank(right) >= rank(needed);

/** Bays with a grant of their own in which the right is at least `needed`, and whether that holds everywhere else. */
export const baysWith = (
  actor: Actor,
  needed: Right,
): Readonly<{ elsewhere: boolean; except: string[]; also: string[] }> => {
  const granted = Object.entries(actor.rights).filter(([bay]) => bay !== "all");
  const elsewhere = atLeast(actor.rights.all ?? RIGHT_OF_ROLE[actor.role], needed);
  return {
    elsewhere,
    except: granted.filter(([, right]) => !atLeast(right, needed)).map(([bay]) => bay),
    also: granted.filter(([, right]) => atLeast(right, needed)).map(([bay]) => bay),
  };
};

const REFUSAL: Record<Right, string> = {
  read: "You may not read here.",
  draft: "Your right here is to read; drafting and submitting need more. Ask an admin for it.",
  release: "Releasing and withdrawing here need a right that you do not have. Ask an admin for it.",
};

const askOf = (verb: Verb): Ask => VERBS[verb];

/** Whether a verb could be allowed to this actor anywhere; bays are asked about later, with the thing in hand. */
export const couldEver = (actor: Actor, verb: Verb): boolean => {
  const ask = askOf(verb);
  if ("roles" in ask) return ask.roles.includes(actor.role);
  if ("inBay" in ask) {
    const { elsewhere, also } = baysWith(actor, ask.inBay);
    return elsewhere || also.length > 0;
  }
  return true;
};

/** Roles to which a verb is open whatever rights they were granted. */
export const rolesThatMay = (verb: Verb): readonly Role[] => {
  const ask = askOf(verb);
  if ("roles" in ask) return ask.roles;
  return "inBay" in ask ? ROLES.filter((role) => atLeast(RIGHT_OF_ROLE[role], ask.inBay)) : ROLES;
};

/** First line of every verb: refuses an actor who may not do this anywhere. */
export const mayAtAll = (actor: Actor, verb: Verb): void => {
  if (couldEver(actor, verb)) return;
  const ask = askOf(verb);
  const user =
    "roles" in ask ? `This is for ${ask.roles.join("s and ")}s.` : "inBay" in ask ? REFUSAL[ask.inBay] : "";
  throw new AppError("forbidden", { user });
};

export const may = (actor: Actor, verb: Verb, bayId: string): boolean => {
  const ask = askOf(verb);
  return couldEver(actor, verb) && (!("inBay" in ask) || atLeast(rightIn(actor, bayId), ask.inBay));
};

/** After the scoped load: refuses an actor whose right in this bay does not reach. */
export const requireRight = (actor: Actor, verb: Verb, bayId: string): void => {
  if (may(actor, verb, bayId)) return;
  const ask = askOf(verb);
  throw new AppError("forbidden", { user: "inBay" in ask ? REFUSAL[ask.inBay] : "You may not do this." });
};
