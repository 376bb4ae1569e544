import type { Drawing } from "@/lib/drawing/schema";
import type { Contact, SectionWarning } from "@/lib/section/section";

const pairOf = ([a, b]: readonly [string, string]): string => (a < b ? `${a}\n${b}` : `${b}\n${a}`);

/**
 * What to say about joints that join nothing: they name a part that is not there, or parts that do not touch along an
 * edge. Bolts may bridge a gap, and a joint marked "none" claims nothing.
 * @param contacts of the section that the drawing describes.
 */
export const jointWarnings = (drawing: Drawing, contacts: readonly Contact[]): readonly SectionWarning[] => {
  const names = new Map(drawing.parts.map((part) => [part.id, part.name || part.id]));
  const touching = new Set(contacts.map(({ parts }) => pairOf(parts)));
  return drawing.joints.flatMap(({ between, kind }): readonly SectionWarning[] => {
    const missing = between.find((id) => !names.has(id));
    if (missing !== undefined)
      return [
        {
          code: "joint.unknownPart",
          detail: `A joint names the part "${missing}", which is not in the drawing. Delete the joint.`,
          parts: between.filter((id) => names.has(id)),
        },
      ];
    if (kind === "none" || kind === "bolts" || touching.has(pairOf(between))) return [];
    const [a, b] = between.map((id) => names.get(id) ?? id);
    return [
      {
        code: "joint.noContact",
        detail: `The weld between ${a} and ${b} joins nothing: they do not touch along an edge. Move one of them, or delete the joint.`,
        parts: between,
      },
    ];
  });
};
