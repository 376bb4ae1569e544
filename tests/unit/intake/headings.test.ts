import { describe, expect, test } from "vitest";
import { readUnit } from "@/lib/intake/file-units";
import { recogniseColumns } from "@/lib/intake/recognise-columns";
import { bytesOf, takeIn } from "./intake-of";

const goes = (headings: readonly string[], units: readonly string[] | null = null) =>
  recogniseColumns(headings, units).columns.map((c) => (c.unit === null ? c.field : `${c.field} ${c.unit}`));

describe("headings", () => {
  test("in the notation y–z, symbols with commas, dots, underlines or none", () => {
    const head = [
      "Wel.y [cm3]",
      "W_pl,y (cm³)",
      "iy [cm]",
      "Iz cm^4",
      "Wz,el [cm³]",
      "iz/cm",
      "It in cm4",
      "I_w [dm6]",
    ];
    expect(goes(head)).toEqual(["Sx cm3", "Zx cm3", "rx cm", "Iy cm4", "Sy cm3", "ry cm", "J cm4", "Cw dm6"]);
  });

  test("in the notation x–y of US tables", () => {
    expect(
      goes(["Ix (in.^4)", "Sx (in.^3)", "rx (in.)", "Zx (in³)", "Iy in4", "J (in.^4)", "Cw (in^6)"]),
    ).toEqual(["Ix in4", "Sx in3", "rx in", "Zx in3", "Iy in4", "J in4", "Cw in6"]);
  });

  test("in the notation x–y with W, where S is the first moment of half the section", () => {
    expect(goes(["Ix [cm4]", "Wx [cm3]", "ix [cm]", "Iy [cm4]", "Wy [cm3]", "Sx [cm3]"])).toEqual([
      "Ix cm4",
      "Sx cm3",
      "rx cm",
      "Iy cm4",
      "Sy cm3",
      "note",
    ]);
  });

  test("principal axes: u and v of European angles, z of US ones", () => {
    expect(goes(["Iy [cm4]", "Iz [cm4]", "Iu [cm4]", "iv [cm]"])).toEqual([
      "Ix cm4",
      "Iy cm4",
      "I1 cm4",
      "r2 cm",
    ]);
    expect(goes(["Ix (in4)", "Iy (in4)", "rz (in.)"])).toEqual(["Ix in4", "Iy in4", "r2 in"]);
  });

  test.each([
    [
      "German",
      [
        "Profilbezeichnung",
        "Gewicht [kg/m]",
        "Höhe [mm]",
        "Breite [mm]",
        "Stegdicke [mm]",
        "Flanschdicke [mm]",
        "Ausrundungsradius [mm]",
        "Querschnittsfläche [cm²]",
      ],
    ],
    [
      "French",
      [
        "Désignation",
        "Masse [kg/m]",
        "Hauteur [mm]",
        "Largeur [mm]",
        "Épaisseur âme [mm]",
        "Épaisseur aile [mm]",
        "Rayon [mm]",
        "Aire [cm²]",
      ],
    ],
    [
      "Italian",
      [
        "Denominazione",
        "Peso [kg/m]",
        "Altezza [mm]",
        "Larghezza [mm]",
        "Spessore anima [mm]",
        "Spessore ala [mm]",
        "Raggio [mm]",
        "Area [cm²]",
      ],
    ],
    [
      "Spanish",
      [
        "Denominación",
        "Masa [kg/m]",
        "Canto [mm]",
        "Ancho [mm]",
        "Espesor alma [mm]",
        "Espesor ala [mm]",
        "Radio [mm]",
        "Área [cm²]",
      ],
    ],
    [
      "English",
      [
        "Section",
        "Mass per metre [kg/m]",
        "Depth of section [mm]",
        "Width of section [mm]",
        "Web thickness [mm]",
        "Flange thickness [mm]",
        "Root radius [mm]",
        "Area of section [cm²]",
      ],
    ],
  ])("in %s words", (_, head) => {
    expect(goes(head)).toEqual([
      "designation",
      "mass kg/m",
      "depth mm",
      "width mm",
      "webThickness mm",
      "flangeThickness mm",
      "rootRadius mm",
      "area cm2",
    ]);
  });

  test("second moments and moduli in words carry their axis", () => {
    const head = [
      "Second moment of area y-y [cm⁴]",
      "Second moment of area z-z [cm⁴]",
      "Elastic modulus y-y [cm³]",
      "Plastic modulus z-z [cm³]",
      "Radius of gyration y-y [cm]",
    ];
    expect(goes(head)).toEqual(["Ix cm4", "Iy cm4", "Sx cm3", "Zy cm3", "rx cm"]);
  });

  test("all in capitals, the unit says whether I or i is meant", () => {
    expect(goes(["IY [CM4]", "IZ [CM4]", "IY [CM]"])).toEqual(["Ix cm4", "Iy cm4", "rx cm"]);
  });

  test("an axis that cannot be told is asked, not guessed", () => {
    const { columns } = recogniseColumns(["Bezeichnung", "Iy [cm4]", "h [mm]"], null);
    expect(columns[1]).toMatchObject({ field: "note", question: expect.stringContaining("axis") });
  });

  test("a field is claimed once; h goes before d", () => {
    expect(goes(["d [mm]", "h [mm]", "h [mm]"])).toEqual(["note", "depth mm", "note"]);
  });

  test("missing units follow the table's own system, and are asked where it shows none", () => {
    expect(goes(["h [mm]", "A", "Iy", "Iz", "iy"])).toEqual([
      "depth mm",
      "area cm2",
      "Ix cm4",
      "Iy cm4",
      "rx cm",
    ]);
    expect(recogniseColumns(["h", "A"], null).columns.map((c) => c.question)).toEqual([
      expect.stringContaining("unit"),
      expect.stringContaining("unit"),
    ]);
  });
});

test.each([
  ["cm⁴", "cm4"],
  ["(in.^4)", "in4"],
  ["10³ cm⁶", "10^3cm6"],
  ["10^9 mm^6", "10^9mm6"],
  ["kg / m", "kg/m"],
  ["lb/ft", "lb/ft"],
  ["plf", "lb/ft"],
  ["cm**3", "cm3"],
])("the unit %s is %s", (text, unit) => expect(readUnit(text)).toBe(unit));
test("a word is no unit", () => expect(readUnit("EUR/t")).toBeNull());

describe("a kept reading", () => {
  const text = "Nr;Typ;h [mm];b [mm];tw [mm];tf [mm];r [mm];A [cm²]\nT 1;IPE;200;100;5,6;8,5;12;28,48\n";
  test("is used again for a file with the same headings, and is named as the evidence", () => {
    const first = takeIn(bytesOf(text));
    expect(first.recognition?.questions.join()).toContain("Designation");
    const reading = first.recognition?.reading;
    if (reading === undefined) throw new Error("the file was not read");
    const corrected = {
      ...reading,
      tolerance: 0.02,
      columns: reading.columns.map((c) => (c.heading === "Nr" ? { ...c, field: "designation" as const } : c)),
    };
    const again = takeIn(bytesOf(text), { saved: [{ name: "Northgate", reading: corrected }] });
    expect(again.recognition).toMatchObject({
      evidence: { reading: "Northgate" },
      questions: [],
      reading: { tolerance: 0.02 },
    });
    expect(again.rows[0]?.inspection).toMatchObject({ designation: "T 1", verdict: "accepted" });
  });
  test("is not used when a heading differs", () => {
    const reading = takeIn(bytesOf(text)).recognition?.reading;
    if (reading === undefined) throw new Error("the file was not read");
    expect(
      takeIn(bytesOf(text.replace("Nr;", "No;")), { saved: [{ name: "N", reading }] }).recognition?.evidence
        .reading,
    ).toBeNull();
  });
  test("another delimiter chosen by a person brings other columns, recognised anew", () => {
    const reading = takeIn(bytesOf(text)).recognition?.reading;
    if (reading === undefined) throw new Error("the file was not read");
    const wrong = { ...reading, delimiter: "|" as const };
    const lines = "Nr|h [mm]\n1;2|200\n";
    expect(takeIn(bytesOf(lines), { corrected: wrong }).recognition?.reading.columns).toMatchObject([
      { heading: "Nr" },
      { heading: "h [mm]", field: "depth" },
    ]);
  });
});
