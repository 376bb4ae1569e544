import type { LogEntry } from "@/lib/schemas/log";

/** What a deed is called in the log; a verb without a word of its own is shown by its name. */
const WORDS: Record<string, string> = {
  "session.open": "signed in",
  "session.close": "signed out",
  "me.update": "own settings",
  "me.changePassword": "password changed",
  "organisation.update": "firm changed",
  "organisation.create": "firm made",
  "member.update": "member changed",
  "member.endSessions": "signed out everywhere",
  "right.put": "rights",
  "rightRequest.create": "rights asked for",
  "rightRequest.decide": "request decided",
  "invitation.create": "invited",
  "invitation.revoke": "invitation revoked",
  "invitation.accept": "invitation accepted",
  "token.create": "token made",
  "token.revoke": "token revoked",
  "bay.create": "bay made",
  "bay.update": "bay changed",
  "bay.delete": "bay deleted",
  "shape.create": "drafted",
  "shape.update": "renamed",
  "shape.tag": "tagged",
  "revision.create": "new revision",
  "revision.update": "saved",
  "revision.discard": "draft discarded",
  "revision.submit": "submitted",
  "revision.check": "checked",
  "revision.sendBack": "sent back",
  "revision.release": "released",
  "revision.withdraw": "withdrawn",
  "take.create": "taken",
  "take.delete": "take removed",
  "comment.create": "commented",
  "comment.delete": "comment removed",
  "delivery.create": "delivery announced",
  "delivery.putFile": "unloaded",
  "delivery.decide": "row decided",
  "delivery.putReading": "columns corrected",
  "delivery.putAway": "put away",
  "delivery.return": "returned",
  "delivery.stop": "reading stopped",
  "delivery.delete": "delivery deleted",
};

export const deedWord = (verb: string): string => WORDS[verb] ?? verb;

export const DEED_CHOICES: readonly { value: string; label: string }[] = Object.entries(WORDS)
  .map(([value, label]) => ({ value, label }))
  .sort((a, b) => a.label.localeCompare(b.label, "en"));

const HIDDEN = new Set([
  "ordinal",
  "id",
  "version",
  "bayId",
  "organisationId",
  "createdAt",
  "updatedAt",
  "contentHash",
  "drawing",
]);

const shown = (value: unknown): string => {
  if (value === null || value === undefined || value === "") return "none";
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (typeof value === "number" || typeof value === "string") return String(value);
  return "…";
};

const spaced = (key: string) => key.replace(/([A-Z])/g, (letter) => ` ${letter.toLowerCase()}`);

/** Before and after in words: the fields that differ, "role designer to engineer". */
export const deedDetail = ({ before, after }: Pick<LogEntry, "before" | "after">): string => {
  const keys = Object.keys(after ?? before ?? {}).filter((key) => !HIDDEN.has(key));
  return keys
    .flatMap((key) => {
      const [was, is] = [shown(before?.[key]), shown(after?.[key])];
      if (was === is || (before === null && is === "none")) return [];
      return [before === null ? `${spaced(key)} ${is}` : `${spaced(key)} ${was} to ${is}`];
    })
    .join(", ");
};
