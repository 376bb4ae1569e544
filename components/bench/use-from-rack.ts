"use client";
import { useMemo } from "react";
import { useBenchContext } from "@/components/bench/bench-store";
import { api, ApiProblem, sentenceOf } from "@/lib/client/api";
import { middleOf, boxOfParts, partBox } from "@/lib/drawing/placed-part";
import { pasteClip } from "@/lib/drawing/clip";
import { groupParts } from "@/lib/drawing/edit-parts";
import type { Drawing } from "@/lib/drawing/schema";
import { err, ok, type Fault, type Result } from "@/lib/result";
import { designationKey } from "@/lib/schemas/designation";
import type { FinderPage } from "@/lib/schemas/find-shapes";
import type { ShapeSheet } from "@/lib/schemas/shape";

/**
 * A drawing brought in as parts of another: on top of what is drawn (a profile with the revision it came from), several parts
 * as one group.
 */
export const bringIn = (
  drawing: Drawing,
  source: Drawing,
  from: Readonly<{ shape: string; revision: number }>,
): Readonly<{ drawing: Drawing; ids: readonly string[] }> => {
  const box = boxOfParts(drawing);
  const own = boxOfParts(source);
  const by =
    own === null
      ? { x: 0, y: 0 }
      : { x: (box ? middleOf(box).x : 0) - middleOf(own).x, y: (box?.yMax ?? 0) - own.yMin };
  const pasted = pasteClip(drawing, source, by);
  const marked = {
    ...pasted.drawing,
    parts: pasted.drawing.parts.map((p) =>
      pasted.ids.includes(p.id) && p.cutout !== true && partBox(p) !== null ? { ...p, from } : p,
    ),
  };
  return { drawing: groupParts(marked, pasted.ids), ids: pasted.ids };
};

/** Shapes of the Rack set on the sheet. */
export const useFromRack = () => {
  const { act } = useBenchContext();
  return useMemo(() => {
    const place = async (shapeId: string): Promise<Result<null, Fault>> => {
      try {
        const { data } = await api.get<ShapeSheet>(`/shapes/${shapeId}`);
        const from = { shape: data.id, revision: data.revision.ordinal };
        const brought = bringIn(act.drawing(), data.revision.drawing, from);
        act.edit(() => brought.drawing);
        act.pick(brought.ids);
        act.say(`${data.designation}, revision ${data.revision.letter}, is on the sheet`);
        return ok(null);
      } catch (cause) {
        return err({ code: "rack.unread", detail: sentenceOf(cause) });
      }
    };
    const byDesignation = async (typed: string): Promise<Result<null, Fault>> => {
      try {
        const { data } = await api.get<FinderPage>("/shapes", { query: { q: typed, limit: 20 } });
        const exact = data.items.find((row) => designationKey(row.designation) === designationKey(typed));
        const hit = exact ?? (data.items.length === 1 ? data.items[0] : undefined);
        if (hit) return await place(hit.id);
        const near = data.items.slice(0, 3).map((row) => row.designation);
        return err({
          code: "rack.noShape",
          detail:
            near.length > 0
              ? `No released shape is called "${typed}". Nearest: ${near.join(", ")}.`
              : `"${typed}" is neither sizes such as 420x36 nor a released shape of the Rack.`,
        });
      } catch (cause) {
        if (!(cause instanceof ApiProblem)) throw cause;
        return err({ code: "rack.unread", detail: cause.message });
      }
    };
    return { place, byDesignation };
  }, [act]);
};
