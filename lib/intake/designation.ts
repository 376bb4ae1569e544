import { MAX_DESIGNATION } from "@/lib/intake/limits";
import { err, ok, type Result } from "@/lib/result";

export type Designation = Readonly<{
  /** As it is kept: composed, trimmed, single spaces. It stays text ("007", "1e3"). */
  text: string;
  /** What must be unique: without case, × as x. */
  key: string;
}>;

const TIMES = /[\u00d7\u2715\u2a09\u2a2f]/g;

const kept = (cell: string) => cell.normalize("NFC").replace(/\s+/gu, " ").trim();

const USUAL = /^[\p{Script=Latin}\p{Script=Greek}\p{Nd} .,:;/\\()[\]{}#&%+\-_*°²³'"½¼¾=@×]$/u;

/** A designation as Goods-in takes it, or why not in one sentence. */
export function readDesignation(cell: string): Result<Designation, string> {
  const text = kept(cell);
  if (text === "") return err("The designation is blank.");
  if (text.length > MAX_DESIGNATION)
    return err(`The designation has ${text.length} characters; at most ${MAX_DESIGNATION} are kept.`);
  if (/^[=+\-@'\u2019\uff1d\uff0b\uff0d\uff20]/.test(text))
    return err(`A designation cannot begin with ${text[0]}: a spreadsheet would take it for a formula.`);
  const odd = [...text].find((c) => !USUAL.test(c));
  if (odd !== undefined) {
    const point = (odd.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, "0");
    return err(`The designation holds U+${point}; letters, digits, spaces and usual punctuation are kept.`);
  }
  return ok({ text, key: text.replace(TIMES, "x").toLocaleLowerCase("en").normalize("NFC") });
}
