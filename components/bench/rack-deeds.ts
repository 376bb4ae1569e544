"use client";
import { useMemo } from "react";
import { useQueryClient } from "@tanstack/react-query";
import { useBenchContext, type ShapeLink } from "@/components/bench/bench-store";
import { figureFaults } from "@/components/bench/figure-faults";
import { shapeLinkOf, withRevision } from "@/components/bench/shape-link";
import { api } from "@/lib/client/api";
import type { Drawing } from "@/lib/drawing/schema";
import type { RevisionRecord, ShapeFamily, ShapeSheet } from "@/lib/schemas/shape";

export type NewShape = Readonly<{
  bayId: string;
  family: ShapeFamily;
  designation: string;
  title: string;
  note: string;
}>;

const versionTag = (version: number) => `"${version}"`;

/** Whether what is drawn differs from what the revision holds. */
export const differsFrom = (link: ShapeLink, drawing: Drawing): boolean =>
  link.drawing !== drawing && JSON.stringify(link.drawing) !== JSON.stringify(drawing);

/** What the Bench does on the Rack: drafts, revisions, submission. Figures come back from the server and are compared. */
export const useRackDeeds = () => {
  const { store, act } = useBenchContext();
  const cache = useQueryClient();
  return useMemo(() => {
    const settle = (shape: ShapeLink) => {
      const { figures, figuresOf, history } = store.getState();
      const faults =
        figures && figuresOf === history.now
          ? figureFaults(figures.properties, shape.revision.properties)
          : [];
      act.set({ shape, engineFault: faults[0] ?? null });
      void cache.invalidateQueries({ queryKey: ["shapes"] });
      act.set({ of: { shapeId: shape.id, ordinal: shape.revision.ordinal } });
    };
    const createShape = async (input: NewShape): Promise<ShapeLink> => {
      const drawing = act.drawing();
      const answer = await api.post<ShapeSheet>("/shapes", { body: { ...input, drawing } });
      const link = { ...shapeLinkOf(answer.data), drawing };
      settle(link);
      return link;
    };
    const saveDraft = async (link: ShapeLink): Promise<ShapeLink> => {
      const drawing = act.drawing();
      if (!differsFrom(link, drawing)) return link;
      const answer = await api.patch<RevisionRecord>(
        `/shapes/${link.id}/revisions/${link.revision.ordinal}`,
        {
          body: { drawing },
          ifMatch: versionTag(link.revision.version),
        },
      );
      const next = { ...withRevision(link, answer.data), drawing };
      settle(next);
      return next;
    };
    const newRevision = async (link: ShapeLink, note: string): Promise<ShapeLink> => {
      const drawing = act.drawing();
      const sheet = await api.get<ShapeSheet>(`/shapes/${link.id}`);
      const answer = await api.post<RevisionRecord>(`/shapes/${link.id}/revisions`, {
        body: { drawing, note },
        ifMatch: sheet.etag,
      });
      const next = { ...withRevision({ ...link, version: sheet.data.version }, answer.data), drawing };
      settle(next);
      return next;
    };
    const submit = async (link: ShapeLink): Promise<ShapeLink> => {
      const saved = await saveDraft(link);
      const answer = await api.post<RevisionRecord>(
        `/shapes/${saved.id}/revisions/${saved.revision.ordinal}/submit`,
        { ifMatch: versionTag(saved.revision.version) },
      );
      const next = { ...withRevision(saved, answer.data), drawing: saved.drawing };
      settle(next);
      return next;
    };
    return { createShape, saveDraft, newRevision, submit };
  }, [store, act, cache]);
};
