import { MIN_PASSWORD } from "@/lib/schemas/session";

/** Said before anything is typed. */
export const PASSWORD_RULE = `At least ${MIN_PASSWORD} characters; several unrelated words do well.`;

/** What is wrong with a new password at first sight, or null; the server judges whether it is easy to guess. */
export const passwordFault = (password: string): string | null => {
  if (!password) return "The new password is missing.";
  // Counted as the server counts.
  if (password.length >= MIN_PASSWORD) return null;
  return `The new password has ${password.length} characters; it needs at least ${MIN_PASSWORD}. It is kept as you typed it.`;
};
