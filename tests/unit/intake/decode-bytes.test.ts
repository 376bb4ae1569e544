import { describe, expect, test } from "vitest";
import { decodeBytes } from "@/lib/intake/decode-bytes";
import { bytesOf } from "./intake-of";

const utf16 = (text: string, bigEndian: boolean, mark: boolean) => {
  const units = [...(mark ? "\ufeff" : ""), ...text].map((c) => c.charCodeAt(0));
  return new Uint8Array(units.flatMap((u) => (bigEndian ? [u >> 8, u & 255] : [u & 255, u >> 8])));
};
const latin = (text: string) => new Uint8Array([...text].map((c) => c.charCodeAt(0)));
const TABLE = "Bezeichnung;h [mm]\nTr\u00e4ger 1;100\n";

describe("encodings", () => {
  test.each([
    ["UTF-8", bytesOf(TABLE), "utf-8"],
    ["UTF-8 with a mark", bytesOf(`\ufeff${TABLE}`), "utf-8"],
    ["UTF-16 LE with a mark", utf16(TABLE, false, true), "utf-16le"],
    ["UTF-16 BE with a mark", utf16(TABLE, true, true), "utf-16be"],
    ["UTF-16 LE without", utf16(TABLE, false, false), "utf-16le"],
    ["UTF-16 BE without", utf16(TABLE, true, false), "utf-16be"],
  ])("%s is recognised and said", (_, bytes, encoding) => {
    expect(decodeBytes(bytes)).toMatchObject({ ok: true, value: { text: TABLE, encoding } });
  });

  test("Windows-1252 is read only when a person has confirmed it, on sample lines", () => {
    const asked = decodeBytes(latin(TABLE));
    expect(asked).toMatchObject({
      ok: false,
      error: { code: "encoding.confirm", line: 2, column: 3, samples: ["Träger 1;100"] },
    });
    expect(decodeBytes(latin(TABLE), "windows-1252")).toMatchObject({ ok: true, value: { text: TABLE } });
  });

  test("bytes that a confirmed encoding does not have are refused with their place", () => {
    expect(decodeBytes(new Uint8Array([65, 10, 66, 0x81]), "windows-1252")).toMatchObject({
      ok: false,
      error: { code: "file.controlCharacter", line: 2, column: 2 },
    });
    expect(decodeBytes(latin(TABLE), "utf-8")).toMatchObject({
      ok: false,
      error: { code: "encoding.badByte", byte: 21 },
    });
  });

  test.each([
    ["a sequence cut at the end", [...bytesOf("a;b\nc;"), 0xe2, 0x82], 2],
    ["a lone continuation byte", [0x61, 0x0a, 0x0a, 0xbf], 3],
    ["an overlong sequence", [0x61, 0xc0, 0xaf], 1],
  ])("%s names its line", (_, bytes, line) => {
    expect(decodeBytes(new Uint8Array(bytes))).toMatchObject({ ok: false, error: { line } });
  });

  test("half a surrogate pair in UTF-16 is refused", () => {
    expect(decodeBytes(new Uint8Array([0xff, 0xfe, 0x41, 0, 0, 0xd8]))).toMatchObject({ ok: false });
  });
});

describe("what is no table", () => {
  test.each([
    ["nothing", [], "file.empty"],
    ["a workbook", [0x50, 0x4b, 3, 4, 0, 0], "file.notText"],
    ["a PDF", [...bytesOf("%PDF-1.7")], "file.notText"],
    ["a NUL", [...bytesOf("a;b\nc;\u0000d")], "file.controlCharacter"],
    ["too much", new Array<number>(26_214_401).fill(65), "file.tooLarge"],
  ])("%s is given back with its reason", (_, bytes, code) => {
    expect(decodeBytes(new Uint8Array(bytes))).toMatchObject({ ok: false, error: { code } });
  });
});
