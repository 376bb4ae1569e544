import { z } from "zod";

/** Look-alikes of the multiplication sign, written as ×. */
const TIMES = /[\u2715\u2a09\u2a2f]/g;

/** Designation as it is stored and shown: NFC, trimmed, inner spaces single. */
export const normaliseDesignation = (text: string): string =>
  text.normalize("NFC").replace(/\s+/gu, " ").trim().replace(TIMES, "\u00d7");

/** What makes two designations the same: case is ignored and × counts as x. */
export const designationKey = (text: string): string =>
  normaliseDesignation(text)
    .replace(/\u00d7/g, "x")
    .toLocaleLowerCase("en")
    .normalize("NFC");

/** Text of a search or a designation with spacing, case and × forgiven. */
export const foldForSearch = (text: string): string => designationKey(text).replace(/\s/gu, "");

const ALLOWED = /^[\p{Script=Latin}\p{Script=Greek}\p{Nd} .,:;/\\()[\]{}#&%+\-_*°²³'"½¼¾=@×]*$/u;

/**
 * A designation: Latin and Greek letters, digits, spaces and usual punctuation, 1 to 120 characters, not beginning with
 * = + - @ or an apostrophe (spreadsheets would run or swallow it). Digits stay text: "007" and "1e3" are kept as typed.
 */
export const Designation = z
  .string()
  .transform(normaliseDesignation)
  .pipe(
    z
      .string()
      .min(1, "a designation is needed")
      .max(120, "at most 120 characters")
      .regex(/^[^=+\-@']/, "must not begin with = + - @ or an apostrophe")
      .regex(ALLOWED, "only Latin and Greek letters, digits, spaces and usual punctuation"),
  );
