import type { OfficePage } from "@/components/office/office-nav";
import { couldEver, type Verb } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";

const PAGES: readonly (OfficePage & { asks: Verb })[] = [
  { href: "/office", name: "Members", asks: "member.list" },
  { href: "/office/bays", name: "Bays", asks: "bay.update" },
  { href: "/office/log", name: "Log", asks: "log.list" },
  { href: "/office/firm", name: "Firm", asks: "organisation.update" },
];

/** The pages of the Office that this person may open. */
export const officePages = (actor: Actor): OfficePage[] =>
  PAGES.filter(({ asks }) => couldEver(actor, asks)).map(({ href, name }) => ({ href, name }));
