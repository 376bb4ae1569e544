import type { FieldKey } from "@/lib/intake/fields";
import { FILE_UNITS, readUnit, type FileUnitKey, type UnitKind } from "@/lib/intake/file-units";

/** A heading split into its words and its unit: "Wel,y [cm³]", "A (in.^2)", "G kg/m", "Iy in cm4". */
export type HeadingParts = Readonly<{ name: string; unit: FileUnitKey | null }>;

export function splitHeading(heading: string): HeadingParts {
  const text = heading.trim().replace(/\s+/g, " ");
  const bracket = /^(.*?)\s*[[({]([^\])}]*)[\])}]\s*$/.exec(text);
  if (bracket !== null) {
    const unit = readUnit(bracket[2] ?? "");
    if (unit !== null) return { name: (bracket[1] ?? "").trim(), unit };
  }
  const tail = /^(.*?)(?:\s+in\s+|\s*[/|,]\s*|\s+)(\S+(?:\s?\/\s?\S+)?|10\S?\s\S+)$/.exec(text);
  if (tail !== null) {
    const unit = readUnit(tail[2] ?? "");
    if (unit !== null && (tail[1] ?? "") !== "") return { name: (tail[1] ?? "").trim(), unit };
  }
  return { name: text, unit: readUnit(text) };
}

export type Quantity = "I" | "S" | "Z" | "r";
export type Axis = "x" | "y" | "z" | "u" | "v" | "strong" | "weak" | "";

/** What a heading means before the table's axes are known: a field, or a quantity about an axis. */
export type Meaning =
  | Readonly<{ kind: "field"; field: FieldKey; evidence: string }>
  | Readonly<{ kind: "about"; quantity: Quantity; axis: Axis; evidence: string }>
  | Readonly<{ kind: "unknown" }>;

const QUANTITY_KIND: Record<Quantity, UnitKind> = { I: "inertia", S: "modulus", Z: "modulus", r: "length" };

/** Symbols, case as written, without marks: "Wel,y" is "Wely". */
const FIELD_SYMBOLS: readonly (readonly [RegExp, FieldKey])[] = [
  [/^(G|g|m|M|W|w|Wt|wt|WT|nominalWt|unitWt)$/, "mass"],
  [/^A$|^Ag$/, "area"],
  [/^(h|H|d|ht)$/, "depth"],
  [/^(b|B|bf|w|W|bfl)$/, "width"],
  [/^(tw|s|a|e0|tweb)$/, "webThickness"],
  [/^(tf|tfl|e1)$/, "flangeThickness"],
  [/^(t|T|tdes|e|wall)$/, "thickness"],
  [/^(tnom|Tnom)$/, "nominalThickness"],
  [/^(r|R|r1|R1|rr)$/, "rootRadius"],
  [/^(r2|R2|rt|rtoe)$/, "toeRadius"],
  [/^(ro|Ro|ra|Ra|rext)$/, "outerRadius"],
  [/^(ri|Ri|rint)$/, "innerRadius"],
  [/^(k|kdes|kDes)$/, "kDesign"],
  [/^(D|OD|da|Da|od)$/, "diameter"],
  [/^(c|C|lip)$/, "lip"],
  [/^(J|It|IT|Jt|IT|Ixt)$/, "J"],
  [/^(Cw|CW|Iw|IW|Iomega|Iω)$/, "Cw"],
];

/** Words, without marks and accents, lower case; the languages of European mills and US tables. */
const FIELD_WORDS: readonly (readonly [RegExp, FieldKey])[] = [
  [
    /^(designation|bezeichnung|benennung|section|sectionsize|size|profil|profile|profilbezeichnung|shape|shapename|name|denominazione|sigla|profilo|denominacion|perfil|designacion|aanduiding|profiel|oznaczenie|ksztaltownik|denumire|label|aiscmanuallabel|member)$/,
    "designation",
  ],
  [
    /^(series|serie|reihe|type|typ|tipo|family|famille|familie|shapetype|gruppe|group|rodzaj|profilreihe)$/,
    "series",
  ],
  [/^(standard|norm|norme|norma|productstandard|produktnorm|code)$/, "standard"],
  [
    /^(mass|masse|massa|masa|weight|gewicht|poids|peso|waga|nominalweight|nominalmass|massperm|masspermetre|masspermeter|weightpermetre|weightpermeter|massperlength|massperunitlength|massemetre|massproMeter|gewichtprometer|linearmass|unitmass|unitweight)$/i,
    "mass",
  ],
  [
    /^(area|flache|querschnitt|querschnittsflache|crosssection|crosssectionalarea|sectionalarea|sectionarea|aire|section|superficie|oppervlakte|doorsnede|pole|polepowierzchni|areaofsection)$/,
    "area",
  ],
  [
    /^(depth|height|hohe|profilhohe|hauteur|altezza|altura|canto|hoogte|wysokosc|overalldepth|depthofsection|legLong|leglong)$/i,
    "depth",
  ],
  [
    /^(width|breite|flanschbreite|flangewidth|largeur|larghezza|ancho|breedte|szerokosc|overallwidth|widthofsection|legshort)$/,
    "width",
  ],
  [
    /^(webthickness|stegdicke|steg|epaisseurame|ame|spessoreanima|espesoralma|lijfdikte|gruboscsrodnika|thicknessweb|web)$/,
    "webThickness",
  ],
  [
    /^(flangethickness|flanschdicke|flansch|epaisseuraile|aile|spessoreala|espesorala|flensdikte|gruboscstopki|thicknessflange|flange)$/,
    "flangeThickness",
  ],
  [
    /^(thickness|dicke|wanddicke|wall|wallthickness|designwall|designwallthickness|epaisseur|spessore|espesor|dikte|wanddikte|grubosc)$/,
    "thickness",
  ],
  [/^(nominalwall|nominalwallthickness|nominalthickness|nennwanddicke)$/, "nominalThickness"],
  [
    /^(rootradius|radius|ausrundungsradius|radiusroot|rayon|raggio|radio|afrondingsstraal|promien|filletradius|fillet)$/,
    "rootRadius",
  ],
  [/^(toeradius|kantenradius|radiustoe)$/, "toeRadius"],
  [/^(outerradius|aussenradius|externalradius|outsideradius)$/, "outerRadius"],
  [/^(innerradius|innenradius|internalradius|insideradius)$/, "innerRadius"],
  [
    /^(diameter|outsidediameter|outerdiameter|durchmesser|aussendurchmesser|diametre|diametro|srednica)$/,
    "diameter",
  ],
  [/^(flangeslope|slope|neigung|pente)$/, "flangeSlope"],
  [
    /^(torsionconstant|torsionalconstant|stvenanttorsionalconstant|torsionstragheitsmoment|inertieentorsion|torsionsinertia)$/,
    "J",
  ],
  [/^(warpingconstant|wolbwiderstand|wolbflachenmoment|wolbtragheitsmoment)$/, "Cw"],
];

const QUANTITY_SYMBOLS: readonly (readonly [RegExp, Quantity])[] = [
  [/^W_?pl(?:ast)?([xyzuv])$|^W([xyzuv])_?pl(?:ast)?$|^Z(?:pl)?([xyzuv])$|^Wpl([xyzuv])\1$/i, "Z"],
  [
    /^W_?el(?:ast)?([xyzuv])(?:min)?$|^W([xyzuv])_?el(?:ast)?(?:min)?$|^W([xyzuv])(?:min)?$|^S([xyzuv12])(?:min)?$/i,
    "S",
  ],
  [/^I([xyzuv12])$|^I([xyzuv])\2$|^J([xyzuv])$/, "I"],
  [/^i([xyzuv12])$|^i([xyzuv])\2$|^r([xyzuv])$|^r([xyzuv])\4$/, "r"],
];

const QUANTITY_WORDS: readonly (readonly [RegExp, Quantity])[] = [
  [/plastic|plastisch|plastique|plastico|plast/, "Z"],
  [
    /sectionmodulus|elasticmodulus|elastic|widerstandsmoment|moduledeflexion|moduleelastique|modulodiresistenza|moduloelastico|modulus|weerstandsmoment|wskaznik/,
    "S",
  ],
  [
    /radiusofgyration|gyration|tragheitsradius|rayondegiration|raggiodinerzia|radiodegiro|traagheidsstraal|promienbezwladnosci/,
    "r",
  ],
  [
    /secondmoment|momentofinertia|flachenmoment|tragheitsmoment|inertia|inertie|inerzia|inercia|traagheidsmoment|momentbezwladnosci/,
    "I",
  ],
];

const compactCase = (name: string) => name.normalize("NFKD").replace(/[^A-Za-z0-9\u03c9]/g, "");
const compact = (name: string) =>
  name
    .replaceAll("ß", "ss")
    .replaceAll("ł", "l")
    .normalize("NFKD")
    .replace(/[\u0300-\u036f]/g, "")
    .toLowerCase()
    .replace(/[^a-z0-9]/g, "");

const fits = (field: FieldKey, kind: UnitKind | null, kinds: (field: FieldKey) => UnitKind | null) =>
  kind === null || kinds(field) === kind;

/** The meaning of one heading by its words and, where it has one, its unit (which decides between `Iy` in cm⁴ and in cm). */
export function meaningOf(parts: HeadingParts, kinds: (field: FieldKey) => UnitKind | null): Meaning {
  const kind = parts.unit === null ? null : FILE_UNITS[parts.unit].kind;
  const symbol = compactCase(parts.name);
  const words = compact(parts.name);
  const byKey = exactKey(parts.name);
  if (byKey !== null && fits(byKey, kind, kinds))
    return { kind: "field", field: byKey, evidence: `the heading is its key` };
  for (const [pattern, quantity] of QUANTITY_SYMBOLS) {
    const match = pattern.exec(symbol);
    if (match === null || (kind !== null && kind !== QUANTITY_KIND[quantity])) continue;
    const axis = match.slice(1).find((group) => group !== undefined) ?? "";
    return { kind: "about", quantity, axis: axisOf(axis), evidence: `symbol ${parts.name}` };
  }
  for (const [pattern, field] of FIELD_SYMBOLS)
    if (pattern.test(symbol) && fits(field, kind, kinds))
      return { kind: "field", field, evidence: `symbol ${parts.name}` };
  for (const [pattern, field] of FIELD_WORDS)
    if (pattern.test(words) && fits(field, kind, kinds))
      return { kind: "field", field, evidence: `the word ${parts.name}` };
  for (const [pattern, quantity] of QUANTITY_WORDS) {
    if (!pattern.test(words) || (kind !== null && kind !== QUANTITY_KIND[quantity])) continue;
    return { kind: "about", quantity, axis: axisInWords(parts.name), evidence: `the words ${parts.name}` };
  }
  const upper = upperCaseSymbol(symbol, kind);
  return upper ?? { kind: "unknown" };
}

/** "IY" under cm is a radius, under cm⁴ a second moment: only with a unit. */
function upperCaseSymbol(symbol: string, kind: UnitKind | null): Meaning | null {
  const match = /^[IiRr]([XYZUVxyzuv])$/.exec(symbol);
  if (match === null || (kind !== "length" && kind !== "inertia")) return null;
  const quantity = kind === "length" ? "r" : "I";
  return {
    kind: "about",
    quantity,
    axis: axisOf((match[1] ?? "").toLowerCase()),
    evidence: `symbol ${symbol} and its unit`,
  };
}

const KEYS = new Map<string, FieldKey>(
  Object.entries({
    legLong: "depth",
    legShort: "width",
    flangeWidth: "width",
    webThickness: "webThickness",
    flangeThickness: "flangeThickness",
    rootRadius: "rootRadius",
    toeRadius: "toeRadius",
    outerRadius: "outerRadius",
    innerRadius: "innerRadius",
    family: "series",
  } as const),
);

const exactKey = (name: string): FieldKey | null => KEYS.get(name.trim()) ?? null;

function axisOf(letter: string): Axis {
  switch (letter.toLowerCase()) {
    case "x":
    case "y":
    case "z":
    case "u":
    case "v":
      return letter.toLowerCase() as Axis;
    case "1":
      return "u";
    case "2":
      return "v";
    default:
      return "";
  }
}

function axisInWords(name: string): Axis {
  const plain = name
    .normalize("NFKD")
    .replace(/[\u0300-\u036f]/g, "")
    .toLowerCase();
  if (/\b(strong|major|stark\w*|fort\w*|forte|fuerte|sterke)\b/.test(plain)) return "strong";
  if (/\b(weak|minor|schwach\w*|faible|debole|debil|zwakke)\b/.test(plain)) return "weak";
  const letter =
    /\b(?:axis |achse |axe |asse |eje |as )?[a-z]{0,3}?([xyzuv])(?:\s?[-\u2013]\s?[xyzuv])?\b(?!.*\b[xyzuv]\b)/.exec(
      plain,
    );
  const pair =
    /\b([xyzuv])\s?[-\u2013]\s?\1\b/.exec(plain) ??
    /\b[iwrs]?(?:el|pl)?[,._]?([xyzuv])\b/.exec(plain) ??
    letter;
  return axisOf(pair?.[1] ?? "");
}
