import type { DrawingPart } from "@/lib/drawing/schema";

/**
 * Copied parts told apart from what they were copied from: those of one group share one new group, and those of one starter
 * belong to one new starter. Ids must be the new ones already.
 */
export const renameShared = (copies: readonly DrawingPart[]): DrawingPart[] => {
  const groups = new Map<string, string>();
  const starters = new Map<string, string>();
  return copies.map((p) => {
    if (p.group !== undefined && !groups.has(p.group)) groups.set(p.group, `g-${p.id}`);
    const group = p.group === undefined ? {} : { group: groups.get(p.group) ?? p.group };
    if (p.cutout === true || p.starter === undefined) return { ...p, ...group };
    const instance = String(p.starter.instance);
    if (!starters.has(instance)) starters.set(instance, `s-${p.id}`);
    return { ...p, ...group, starter: { ...p.starter, instance: starters.get(instance) ?? instance } };
  });
};
