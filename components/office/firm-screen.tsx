"use client";
import { useState } from "react";
import { useMutation } from "@tanstack/react-query";
import { Moment } from "@/components/office/moments";
import { OfficeNav, type OfficePage } from "@/components/office/office-nav";
import { Sheet } from "@/components/sheet/sheet";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { Button } from "@/components/ui/button";
import { TextArea, TextField } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { SelectField } from "@/components/ui/select";
import { api, ApiProblem, sentenceOf } from "@/lib/client/api";
import type { Organisation } from "@/lib/schemas/organisation";

type FirmScreenProps = Readonly<{ pages: readonly OfficePage[]; firm: Organisation }>;

const FIELDS = ["name", "address", "notation", "units", "decimal", "fourEyes"] as const;

/** The firm: what sheets print, how figures are written, and whether four eyes are needed. Conflicts show both states. */
export function FirmScreen({ pages, firm }: FirmScreenProps) {
  const [saved, setSaved] = useState(firm);
  const [savedAt, setSavedAt] = useState<string | null>(null);
  const [draft, setDraft] = useState(firm);
  const changed = FIELDS.filter((field) => draft[field] !== saved[field]);
  const save = useMutation({
    mutationFn: async () => {
      const body = Object.fromEntries(changed.map((field) => [field, draft[field]]));
      return (await api.patch<Organisation>("/organisation", { body, ifMatch: `"${saved.version}"` })).data;
    },
    onSuccess: (next) => {
      setSaved(next);
      setDraft(next);
      setSavedAt(new Date().toISOString());
    },
  });
  const theirs = useMutation({
    mutationFn: async () => (await api.get<Organisation>("/organisation")).data,
    onSuccess: (next) => {
      setSaved(next);
      setDraft((mine) => ({ ...mine, version: next.version }));
      save.reset();
    },
  });
  const problem = save.error instanceof ApiProblem ? save.error : null;
  const set = <K extends (typeof FIELDS)[number]>(field: K, value: Organisation[K]) =>
    setDraft((before) => ({ ...before, [field]: value }));

  return (
    <Sheet
      heading="Office: firm"
      block={
        <TitleBlock>
          <Cell label="Office" big fill>
            Firm
          </Cell>
          <Cell label="Saved" stays="md">
            {savedAt ? <Moment at={savedAt} show="time" /> : "no change yet"}
          </Cell>
          <ActionCell>
            <Button disabled={changed.length === 0} onClick={() => setDraft(saved)}>
              Undo
            </Button>
            <Button
              kind="main"

              disabled={changed.length === 0}
              atWork={save.isPending}
              onClick={() => save.mutate()}
            >
              Save
            </Button>
          </ActionCell>
        </TitleBlock>
      }
    >
      <OfficeNav pages={pages} />
      {save.error && (
        <Notice
          kind={problem?.stale ? "conflict" : "lost"}
          head={problem?.stale ? "Somebody else changed the firm meanwhile." : "The firm was not saved."}
          className="border-b border-rule p-3"
          actions={
            problem?.stale && <Button onClick={() => theirs.mutate()}>Load theirs, keep what I typed</Button>
          }
        >
          {sentenceOf(save.error)} What you typed is still here.
        </Notice>
      )}
      <form
        className="grid max-w-2xl gap-4 p-4"
        onSubmit={(event) => {
          event.preventDefault();
          if (changed.length > 0) save.mutate();
        }}
      >
        <TextField
          label="Name"
          value={draft.name}
          maxLength={120}
          error={problem?.issueAt("/name") ?? null}
          onChange={(event) => set("name", event.target.value)}
        />
        <TextArea
          label="Address, as sheets print it"
          value={draft.address}
          maxLength={500}
          error={problem?.issueAt("/address") ?? null}
          onChange={(event) => set("address", event.target.value)}
        />
        <SelectField
          label="Notation"
          value={draft.notation}
          onChange={(value) => set("notation", value)}
          choices={[
            { value: "S-Z-r", label: "S, Z, r; axes x and y" },
            { value: "Wel-Wpl-i", label: "Wel, Wpl, i; axes y and z" },
          ]}
        />
        <SelectField
          label="Units"
          value={draft.units}
          onChange={(value) => set("units", value)}
          note="Each person may choose otherwise for themselves."
          choices={[
            { value: "mm", label: "metric: mm, kg/m" },
            { value: "in", label: "inch: in, lb/ft" },
          ]}
        />
        <SelectField
          label="Decimal mark"
          value={draft.decimal}
          onChange={(value) => set("decimal", value)}
          choices={[
            { value: "point", label: "point: 12.5" },
            { value: "comma", label: "comma: 12,5" },
          ]}
        />
        <SelectField
          label="Four eyes"
          value={draft.fourEyes ? "on" : "off"}
          onChange={(value) => set("fourEyes", value === "on")}
          note="On: a drawn revision is checked by somebody who has edited none of it, before it is released."
          choices={[
            { value: "on", label: "on: checked by somebody else" },
            { value: "off", label: "off: the author may check and release" },
          ]}
        />
        <button type="submit" className="sr-only" tabIndex={-1}>
          Save
        </button>
      </form>
    </Sheet>
  );
}
