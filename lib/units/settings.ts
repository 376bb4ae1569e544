/** The two systems values are shown in; storage is always mm, N, kg. */
export type UnitSystem = "metric" | "inch";
export type DecimalMark = "." | ",";
/** `S-Z-r`: S, Z, r with axes x–x and y–y. `Wel-Wpl-i`: Wel, Wpl, i with axes y–y and z–z. Code and API always say Sx, Zx, rx. */
export type Notation = "S-Z-r" | "Wel-Wpl-i";

/** How one person sees figures. */
export type DisplaySettings = Readonly<{ system: UnitSystem; decimal: DecimalMark; notation: Notation }>;

export const DEFAULT_DISPLAY: DisplaySettings = { system: "metric", decimal: ".", notation: "S-Z-r" };
