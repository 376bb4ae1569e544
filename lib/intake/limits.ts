/** What a delivery may be. The same figures stand on the screen and are enforced while reading. */
export const MAX_FILE_BYTES = 25 * 1024 * 1024;
export const MAX_ROWS = 100_000;
export const MAX_COLUMNS = 200;
export const MAX_CELL_CHARACTERS = 10_000;
/** Rows whose quotation marks never close are skipped one line at a time; beyond this many the file is given back. */
export const MAX_BROKEN_QUOTES = 100;
/** Records looked at to recognise delimiter, headings, units and marks. */
export const SAMPLE_RECORDS = 60;
export const MAX_DESIGNATION = 120;
