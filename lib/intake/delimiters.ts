export const DELIMITERS = [";", ",", "\t", "|"] as const;
export type Delimiter = (typeof DELIMITERS)[number];

export const DELIMITER_NAME: Record<Delimiter, string> = {
  ";": "semicolon",
  ",": "comma",
  "\t": "tab",
  "|": "pipe",
};
