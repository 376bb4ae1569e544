"use client";
import { useMemo } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { Count, Quantity, UnitOf } from "@/components/display/quantity";
import { FAMILY_NAME } from "@/components/rack/family-names";
import { Balloon } from "@/components/ui/marks";
import { PaneHead, Table, Td, Th } from "@/components/ui/table";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { slendernessOf, type Slenderness } from "@/lib/drawing/slenderness";
import { partMasses } from "@/lib/drawing/part-masses";
import { displayRule } from "@/lib/units/display-units";
import { fromStored } from "@/lib/units/conversion";
import { fieldText } from "@/lib/units/format";
import type { DisplaySettings } from "@/lib/units/settings";

/** Sizes of a part as a cutting list has them: "220×15". */
function sizesOf(part: DrawingPart, settings: DisplaySettings): string {
  const rule = displayRule("length", settings.system);
  const text = (mm: number) =>
    fieldText(fromStored(mm, rule.unit), settings.system === "metric" ? 1 : 3, settings.decimal);
  const { shape } = part;
  if (shape.kind === "plate") {
    const [long, short] =
      shape.width >= shape.height ? [shape.width, shape.height] : [shape.height, shape.width];
    return `${text(long)}×${text(short)}`;
  }
  if (shape.kind === "round")
    return shape.wall ? `ø${text(shape.diameter)}×${text(shape.wall)}` : `ø${text(shape.diameter)}`;
  if (shape.kind === "outline") return "as drawn";
  return Object.values(shape.dimensions)
    .filter((v): v is number => typeof v === "number")
    .slice(0, 4)
    .map(text)
    .join("×");
}

const WORDS: Record<Slenderness["kind"], string> = {
  "face to free edge": "",
  "between faces": "faces",
  "free on all sides": "free",
  "diameter over wall": "D/t",
};

/** The parts of a drawing with their sizes, grades, masses and b/t facts; no class is derived. */
export default function PartsTable({ drawing }: { drawing: Drawing }) {
  const { settings } = useDisplay();
  const facts = useMemo(() => {
    const section = sectionOf(drawing);
    if (!section.ok) return null;
    const slender = slendernessOf(drawing, section.value.contacts);
    const masses = partMasses(section.value);
    return drawing.parts.map((part, i) => {
      const inSection = section.value.parts.find((p) => p.id === part.id);
      return {
        part,
        item: String(i + 1),
        massKgM: masses.get(part.id) ?? null,
        grade: inSection?.material.name ?? "",
        slender: slender.filter((s) => s.part === part.id),
      };
    });
  }, [drawing]);
  if (!facts) return null;
  const plates = facts.every(({ part }) => part.shape.kind === "plate");
  return (
    <>
      <PaneHead className="border-t border-frame">{plates ? "Plates" : "Parts"}</PaneHead>
      <Table className="[&_td]:h-7 [&_td]:px-1.5 [&_td]:max-md:h-7 [&_th]:px-1.5 [&_td:last-child]:pr-2.5 [&_th:last-child]:pr-2.5">
        <thead>
          <tr>
            <Th className="w-10 pl-3">
              <span className="sr-only">Item</span>
            </Th>
            <Th>{plates ? "Plate" : "Part"}</Th>
            <Th numeric unit={<UnitOf dimension="length" />}>
              Size
            </Th>
            <Th>Grade</Th>
            <Th numeric unit={<UnitOf property="mass" />}>
              Mass
            </Th>
            <Th numeric unit="face to free edge">
              b/t
            </Th>
          </tr>
        </thead>
        <tbody>
          {facts.map(({ part, item, massKgM, grade, slender }) => (
            <tr key={part.id}>
              <Td className="pl-3">
                <Balloon>{item}</Balloon>
              </Td>
              <Td className="max-w-[104px] truncate">
                {part.name || (part.shape.kind === "profile" ? FAMILY_NAME[part.shape.family] : part.id)}
                {part.cutout && <span className="text-ink-3"> cut out</span>}
              </Td>
              <Td numeric>{sizesOf(part, settings)}</Td>
              <Td className="max-w-[84px] truncate" title={grade}>
                {grade}
              </Td>
              <Td numeric>
                <Quantity property="mass" value={massKgM} />
              </Td>
              <Td numeric>
                {slender.map((s) => (
                  <span key={s.element + s.kind} className="block leading-[15px]">
                    <Count value={s.ratio} decimals={1} />
                    {WORDS[s.kind] && <span className="font-ui text-note text-ink-3"> {WORDS[s.kind]}</span>}
                  </span>
                ))}
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </>
  );
}
