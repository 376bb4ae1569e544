import type { FileFault } from "@/lib/intake/file-fault";
import { MAX_FILE_BYTES } from "@/lib/intake/limits";
import { err, ok, type Result } from "@/lib/result";

/** UTF-8 and UTF-16 are recognised; the others only when a person has confirmed them. */
export const ENCODINGS = ["utf-8", "utf-16le", "utf-16be", "windows-1252", "windows-1250"] as const;
export type Encoding = (typeof ENCODINGS)[number];

export const ENCODING_NAME: Record<Encoding, string> = {
  "utf-8": "UTF-8",
  "utf-16le": "UTF-16 LE",
  "utf-16be": "UTF-16 BE",
  "windows-1252": "Windows-1252",
  "windows-1250": "Windows-1250",
};

export type DecodedText = Readonly<{
  /** Without byte-order mark, every line end a single \n. */
  text: string;
  encoding: Encoding;
  evidence: string;
}>;

const SIGNATURES: readonly (readonly [readonly number[], string])[] = [
  [[0x50, 0x4b, 0x03, 0x04], "a spreadsheet workbook or a zip archive"],
  [[0xd0, 0xcf, 0x11, 0xe0], "an old spreadsheet workbook"],
  [[0x25, 0x50, 0x44, 0x46], "a PDF"],
  [[0x1f, 0x8b], "a gzip archive"],
];

const startsWith = (bytes: Uint8Array, head: readonly number[]) => head.every((b, i) => bytes[i] === b);

/**
 * Bytes to text. Bytes that do not decode are refused with their place and never replaced; an encoding other than UTF-8 or
 * UTF-16 must be `confirmed` by a person. A confirmed encoding overrides recognition.
 * @returns `encoding.confirm` (with samples) when the bytes are not UTF-8 and nobody has said what they are.
 */
export function decodeBytes(
  bytes: Uint8Array,
  confirmed: Encoding | null = null,
): Result<DecodedText, FileFault> {
  if (bytes.length === 0)
    return err({ code: "file.empty", detail: "The file is empty: choose another.", line: 1, column: 1 });
  if (bytes.length > MAX_FILE_BYTES)
    return err({
      code: "file.tooLarge",
      detail: "The file is larger than 25 MB: split it and bring it in as two deliveries.",
    });
  const binary = SIGNATURES.find(([head]) => startsWith(bytes, head));
  if (binary !== undefined)
    return err({
      code: "file.notText",
      detail: `This is ${binary[1]}, not text: save the table as CSV and bring that in.`,
      line: 1,
      column: 1,
      byte: 0,
    });
  const { encoding, evidence, skip } = confirmed === null ? recognise(bytes) : confirmedAs(bytes, confirmed);
  const body = bytes.subarray(skip);
  const text = strictly(body, encoding);
  if (text === null) {
    const byte = firstBadByte(body, encoding) + skip;
    return err(
      confirmed === null && encoding === "utf-8" ? askFor(bytes, byte) : badByte(bytes, byte, encoding),
    );
  }
  const odd = unwanted(text, encoding);
  if (odd !== null) return err(odd);
  return ok({ text: text.replace(/\r\n?/g, "\n"), encoding, evidence });
}

type Recognised = Readonly<{ encoding: Encoding; evidence: string; skip: number }>;

function recognise(bytes: Uint8Array): Recognised {
  if (startsWith(bytes, [0xef, 0xbb, 0xbf]))
    return { encoding: "utf-8", evidence: "byte-order mark of UTF-8", skip: 3 };
  if (startsWith(bytes, [0xff, 0xfe]))
    return { encoding: "utf-16le", evidence: "byte-order mark of UTF-16 LE", skip: 2 };
  if (startsWith(bytes, [0xfe, 0xff]))
    return { encoding: "utf-16be", evidence: "byte-order mark of UTF-16 BE", skip: 2 };
  const head = bytes.subarray(0, 2000);
  const zeros = [0, 0];
  head.forEach((b, i) => {
    if (b === 0) zeros[i % 2] = (zeros[i % 2] ?? 0) + 1;
  });
  const mostly = head.length * 0.3;
  if ((zeros[1] ?? 0) > mostly && zeros[0] === 0)
    return { encoding: "utf-16le", evidence: "every second byte is zero, no byte-order mark", skip: 0 };
  if ((zeros[0] ?? 0) > mostly && zeros[1] === 0)
    return { encoding: "utf-16be", evidence: "every first byte of two is zero, no byte-order mark", skip: 0 };
  return { encoding: "utf-8", evidence: "every byte sequence is UTF-8, no byte-order mark", skip: 0 };
}

function confirmedAs(bytes: Uint8Array, encoding: Encoding): Recognised {
  const own = recognise(bytes);
  const skip = own.encoding === encoding ? own.skip : 0;
  return { encoding, evidence: "confirmed by a person", skip };
}

function strictly(bytes: Uint8Array, encoding: Encoding): string | null {
  try {
    return new TextDecoder(encoding, { fatal: true, ignoreBOM: true }).decode(bytes);
  } catch (error) {
    if (error instanceof TypeError) return null;
    throw error;
  }
}

/** Bisection over prefixes: decoding a prefix as a stream fails only when a bad sequence lies wholly inside it. */
function firstBadByte(bytes: Uint8Array, encoding: Encoding): number {
  const fails = (length: number) => {
    try {
      new TextDecoder(encoding, { fatal: true, ignoreBOM: true }).decode(bytes.subarray(0, length), {
        stream: true,
      });
      return false;
    } catch {
      return true;
    }
  };
  if (!fails(bytes.length)) return startOfSequence(bytes, bytes.length);
  let good = 0;
  let bad = bytes.length;
  while (bad - good > 1) {
    const middle = (good + bad) >> 1;
    if (fails(middle)) bad = middle;
    else good = middle;
  }
  return encoding === "utf-8" ? startOfSequence(bytes, bad - 1) : bad - 1;
}

/** The first byte of the sequence that breaks at `at`: its lead byte, when one stands just before and is not yet complete. */
function startOfSequence(bytes: Uint8Array, at: number): number {
  for (let back = 1; back <= 3; back += 1) {
    const byte = bytes[at - back];
    if (byte === undefined || byte < 0x80) return at;
    if (byte < 0xc0) continue;
    const length = byte >= 0xf0 ? 4 : byte >= 0xe0 ? 3 : 2;
    return back < length ? at - back : at;
  }
  return at;
}

function placeOf(bytes: Uint8Array, byte: number): { line: number; column: number; start: number } {
  let line = 1;
  let start = 0;
  for (let i = 0; i < byte; i += 1)
    if (bytes[i] === 0x0a || (bytes[i] === 0x0d && bytes[i + 1] !== 0x0a)) {
      line += 1;
      start = i + 1;
    }
  return { line, column: byte - start + 1, start };
}

const hex = (byte: number | undefined) => `0x${(byte ?? 0).toString(16).toUpperCase().padStart(2, "0")}`;

function badByte(bytes: Uint8Array, byte: number, encoding: Encoding): FileFault {
  const { line, column } = placeOf(bytes, byte);
  return {
    code: "encoding.badByte",
    detail: `Byte ${hex(bytes[byte])} in line ${line}, position ${column}, is not ${ENCODING_NAME[encoding]}: choose another encoding or export the table again as UTF-8.`,
    line,
    column,
    byte,
  };
}

function askFor(bytes: Uint8Array, byte: number): FileFault {
  const { line, column } = placeOf(bytes, byte);
  return {
    code: "encoding.confirm",
    detail: `Byte ${hex(bytes[byte])} in line ${line}, position ${column}, is not UTF-8. Read the lines below and say whether they are right in Windows-1252.`,
    line,
    column,
    byte,
    samples: samplesIn(bytes, "windows-1252"),
  };
}

/** Up to five lines with characters beyond ASCII, as `encoding` reads them: what a person confirms an encoding by. */
export function samplesIn(bytes: Uint8Array, encoding: Encoding): readonly string[] {
  const lines = new TextDecoder(encoding).decode(bytes.subarray(0, 200_000)).split(/\r\n?|\n/);
  const telling = lines.filter((line) => /[^\u0000-\u007f]/.test(line));
  return telling.slice(0, 5).map((line) => line.slice(0, 200));
}

/** NUL and the control characters that Windows code pages leave unassigned: decodable, but never text. */
function unwanted(text: string, encoding: Encoding): FileFault | null {
  const found = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f\u0080-\u009f\ufffe\uffff]/.exec(text);
  if (found === null) return null;
  const before = text.slice(0, found.index);
  const line = before.split(/\r\n?|\n/).length;
  const column = found.index - Math.max(before.lastIndexOf("\n"), before.lastIndexOf("\r"));
  const point = `U+${(found[0].codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, "0")}`;
  return {
    code: "file.controlCharacter",
    detail: `Line ${line}, position ${column}, holds the control character ${point}, which no table has (read as ${ENCODING_NAME[encoding]}): remove it or choose another encoding.`,
    line,
    column,
  };
}
