import "server-only";
import { linkTo } from "./link";

type Words = Readonly<{ subject: string; text: string }>;
const lines = (...parts: string[]): string => `${parts.join("\n\n")}\n`;

export const invitationLetter = (
  about: Readonly<{ firm: string; invitedBy: string; role: string; secret: string; name: string }>,
): Words => ({
  subject: `${about.invitedBy} invites you to ${about.firm} on Flitchbook`,
  text: lines(
    `${about.name},`,
    `${about.invitedBy} invites you to the book of cross-sections of ${about.firm}, as ${about.role}.`,
    `To accept, open this page and press the button on it:\n${linkTo(`/invitation?token=${about.secret}`)}`,
    "The link holds for 72 hours and can be used once. If you do not know the sender, do nothing.",
  ),
});

export const resetLetter = (about: Readonly<{ name: string; secret: string }>): Words => ({
  subject: "A new password for Flitchbook",
  text: lines(
    `${about.name},`,
    `Somebody, most likely you, asked for a new password. To choose one, open this page:\n${linkTo(`/password-reset?token=${about.secret}`)}`,
    "The link holds for one hour and can be used once. If it was not you, do nothing: your password stays as it is.",
  ),
});

export const requestLetter = (
  about: Readonly<{ name: string; right: string; bay: string; reason: string }>,
): Words => ({
  subject: `${about.name} asks for a right: ${about.right}, ${about.bay}`,
  text: lines(
    `${about.name} asks for the right to ${about.right} in ${about.bay}.`,
    `Reason: ${about.reason}`,
    `Decide here: ${linkTo("/office/members")}`,
  ),
});

export const decisionLetter = (
  about: Readonly<{ decidedBy: string; right: string; bay: string; granted: boolean; answer: string }>,
): Words => ({
  subject: about.granted
    ? `You now have the right: ${about.right}, ${about.bay}`
    : `Not granted: ${about.right}, ${about.bay}`,
  text: lines(
    about.granted
      ? `${about.decidedBy} has granted you the right to ${about.right} in ${about.bay}. It counts from now on.`
      : `${about.decidedBy} has not granted you the right to ${about.right} in ${about.bay}.`,
    ...(about.answer === "" ? [] : [about.answer]),
  ),
});

export const outdatedLetter = (
  about: Readonly<{
    subject: string;
    what: "superseded" | "withdrawn";
    names: readonly string[];
    by: string;
    shapeId: string;
  }>,
): Words => ({
  subject: `${about.subject} is ${about.what}: you built on it`,
  text: lines(
    `${about.by} has ${about.what === "withdrawn" ? "withdrawn" : "released a newer revision than"} ${about.subject}.`,
    `Built on it, by you:\n${about.names.map((name) => `- ${name}`).join("\n")}`,
    `Its sheet: ${linkTo(`/rack/${about.shapeId}`)}`,
  ),
});
