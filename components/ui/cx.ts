/** Joins class names and leaves out what is not set. */
export const cx = (...names: readonly (string | false | null | undefined)[]): string =>
  names.filter(Boolean).join(" ");
