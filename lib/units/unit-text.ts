import type { UnitName } from "@/lib/units/conversion";

/** A unit as it is set: text with raised figures, since neither font of the look has ⁴ or ⁶. */
export type UnitPiece = Readonly<{ text: string; raised: boolean }>;

const POWER = /^(?:E(\d) )?(mm|cm|m|in|ft)(\d)?$/;

/** Pieces of a unit's name: "E6 mm4" is 10, raised 6, " mm", raised 4. Ratios have none. */
export function unitPieces(unit: UnitName): readonly UnitPiece[] {
  const plain = (text: string): UnitPiece => ({ text, raised: false });
  const raised = (text: string): UnitPiece => ({ text, raised: true });
  if (unit === "1") return [];
  if (unit === "deg") return [plain("°")];
  const power = POWER.exec(unit);
  if (power) {
    const [, ten, base = "", exponent] = power;
    return [
      ...(ten ? [plain("10"), raised(ten), plain(" ")] : []),
      plain(base),
      ...(exponent ? [raised(exponent)] : []),
    ];
  }
  const [first = "", second] = unit.split("/");
  const half = (text: string): UnitPiece[] => {
    const match = /^([a-z]+)(\d)$/i.exec(text);
    return match ? [plain(match[1] ?? ""), raised(match[2] ?? "")] : [plain(text.replace(".", "·"))];
  };
  return second === undefined ? half(first) : [...half(first), plain("/"), ...half(second)];
}

/** A unit in plain text, for labels that are spoken and files: "10^6 mm^4", "kN·m". */
export const unitText = (unit: UnitName): string =>
  unitPieces(unit)
    .map((piece) => (piece.raised ? `^${piece.text}` : piece.text))
    .join("");
