"use client";
import { useQuery } from "@tanstack/react-query";
import { useDeferredValue, useState } from "react";
import { useBench, type ShapeLink } from "@/components/bench/bench-store";
import { useRackDeeds } from "@/components/bench/rack-deeds";
import { familyOf } from "@/components/bench/family-of";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { TextArea, TextField } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { SelectField } from "@/components/ui/select";
import { api, ApiProblem, sentenceOf } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import { useBays } from "@/lib/client/shapes";
import { Designation, designationKey } from "@/lib/schemas/designation";
import type { FinderPage } from "@/lib/schemas/find-shapes";

/** Whether a designation is free, checked while it is typed; null while it is not known. */
const useTaken = (designation: string): boolean | null => {
  const wanted = useDeferredValue(designation.trim());
  const found = useQuery({
    queryKey: queryKeys.shapes({ designation: designationKey(wanted) }),
    enabled: wanted.length > 0,
    staleTime: 5_000,
    queryFn: async ({ signal }) => {
      const query = { q: wanted, limit: 50, state: "draft,submitted,released,withdrawn" };
      return (await api.get<FinderPage>("/shapes", { query, signal })).data.items;
    },
  });
  if (!wanted || !found.data) return null;
  return found.data.some((row) => designationKey(row.designation) === designationKey(wanted));
};

const refusalOf = (designation: string): string | null => {
  if (!designation.trim()) return null;
  const read = Designation.safeParse(designation);
  return read.success ? null : `A designation ${read.error.issues[0]?.message ?? "cannot be that"}.`;
};

/** Saves the sheet as a shape: bay, designation, title, note; a draft revision comes of it. */
export const SaveDialog = ({
  onClose,
  onSaved,
}: {
  onClose: () => void;
  onSaved: (link: ShapeLink) => void;
}) => {
  const name = useBench((s) => s.name);
  const drawing = useBench((s) => s.history.now);
  const deeds = useRackDeeds();
  const bays = useBays();
  const open = (bays.data?.items ?? []).filter((b) => b.right !== "read");
  const [bay, setBay] = useState<string | null>(null);
  const [designation, setDesignation] = useState("");
  const [title, setTitle] = useState(name);
  const [note, setNote] = useState("");
  const [refused, setRefused] = useState<ApiProblem | null>(null);
  const [busy, setBusy] = useState(false);
  const taken = useTaken(designation);
  const bayId = bay ?? open[0]?.id ?? "";
  const wrong =
    refusalOf(designation) ??
    (taken ? "That designation is already in the library." : null) ??
    refused?.issueAt("/designation") ??
    null;
  const ready = designation.trim() !== "" && !wrong && bayId !== "" && !busy;

  const save = async () => {
    if (!ready) return;
    setBusy(true);
    setRefused(null);
    try {
      const link = await deeds.createShape({
        bayId,
        family: familyOf(drawing),
        designation: designation.trim(),
        title: title.trim(),
        note: note.trim(),
      });
      onSaved(link);
    } catch (cause) {
      if (!(cause instanceof ApiProblem)) throw cause;
      setRefused(cause);
    } finally {
      setBusy(false);
    }
  };

  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Save into a bay"
      text="A draft revision, seen by those who may draft in the bay. The server computes its figures."
      actions={
        <>
          <Button kind="main" atWork={busy} disabled={!ready} onClick={() => void save()}>
            Save the draft
          </Button>
          <Button onClick={onClose}>Not now</Button>
        </>
      }
    >
      {bays.isSuccess && open.length === 0 ? (
        <Notice kind="word" head="You may read this Rack, not draft in it.">
          An admin can raise your right in a bay. The drawing stays yours meanwhile.
        </Notice>
      ) : (
        <form
          className="grid gap-3"
          onSubmit={(event) => {
            event.preventDefault();
            void save();
          }}
        >
          <SelectField
            label="Bay"
            value={bayId}
            choices={open.map((b) => ({ value: b.id, label: `${b.ordinal} ${b.name}` }))}
            onChange={setBay}
          />
          <TextField
            label="Designation"
            autoComplete="off"
            spellCheck={false}
            value={designation}
            maxLength={120}
            onChange={(event) => {
              setDesignation(event.target.value);
              setRefused(null);
            }}
            error={wrong}
            note={
              taken === false && !wrong
                ? "This designation is free."
                : "Such as PG 600x300; unique in the firm's library."
            }
          />
          <TextField
            label="Title"
            value={title}
            maxLength={200}
            onChange={(event) => setTitle(event.target.value)}
            error={refused?.issueAt("/title")}
          />
          <TextArea
            label="Note to the checker"
            value={note}
            maxLength={2000}
            onChange={(event) => setNote(event.target.value)}
          />
          {refused && !refused.issueAt("/designation") && <Notice kind="lost" head={sentenceOf(refused)} />}
          <button type="submit" hidden />
        </form>
      )}
    </Dialog>
  );
};

/** A new revision of the shape this sheet belongs to. */
export const RevisionDialog = ({
  link,
  onClose,
  onSaved,
}: {
  link: ShapeLink;
  onClose: () => void;
  onSaved: (link: ShapeLink) => void;
}) => {
  const deeds = useRackDeeds();
  const [note, setNote] = useState("");
  const [refused, setRefused] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);
  const save = async () => {
    setBusy(true);
    setRefused(null);
    try {
      onSaved(await deeds.newRevision(link, note.trim()));
    } catch (cause) {
      setRefused(cause);
    } finally {
      setBusy(false);
    }
  };
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`A new revision of ${link.designation}`}
      text="The revisions before stay as they are; this one begins as a draft."
      actions={
        <>
          <Button kind="main" atWork={busy} disabled={busy} onClick={() => void save()}>
            Save the revision
          </Button>
          <Button onClick={onClose}>Not now</Button>
        </>
      }
    >
      <TextArea
        label="What changed, and why"
        value={note}
        maxLength={2000}
        onChange={(event) => setNote(event.target.value)}
      />
      {refused !== null && <Notice kind="lost" head={sentenceOf(refused)} className="mt-2" />}
    </Dialog>
  );
};
