"use client";
import { useState } from "react";
import { useBench, useBenchActions, type SaveState, type ShapeLink } from "@/components/bench/bench-store";
import { differsFrom, useRackDeeds } from "@/components/bench/rack-deeds";
import { FileMenu } from "@/components/bench/file-menu";
import { RevisionDialog, SaveDialog } from "@/components/bench/save-dialog";
import { useDisplay } from "@/components/display/display-provider";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { Button } from "@/components/ui/button";
import { RevisionMark, StateChip } from "@/components/ui/marks";
import { sentenceOf } from "@/lib/client/api";

/** CSS pixels in a millimetre of paper, by definition 96 to the inch. */
const PX_PER_MM_OF_PAPER = 96 / 25.4;

const time = (iso: string) => new Date(iso).toLocaleTimeString("en-GB");

const savedWords = (state: SaveState, at: string | null): string => {
  switch (state.kind) {
    case "unsaved":
      return "nothing to save";
    case "waiting":
      return at ? `${time(at)}, more to save` : "saving";
    case "saved":
      return at ? time(at) : "saved";
    case "away":
      return "kept here, server away";
    case "signed-out":
      return "kept here, signed out";
    case "conflict":
      return "two states";
    case "refused":
      return "refused";
  }
};

/** Status bar, head and actions: what the sheet is called, where it belongs, when it was saved, what comes next. */
export const BenchTitleBlock = ({ person }: { person: string }) => {
  const act = useBenchActions();
  const name = useBench((s) => s.name);
  const shape = useBench((s) => s.shape);
  const saveState = useBench((s) => s.saveState);
  const savedAt = useBench((s) => s.savedAs?.at ?? null);
  const pxPerMm = useBench((s) => s.view?.pxPerMm ?? null);
  const { settings } = useDisplay();
  const scale = pxPerMm === null ? null : PX_PER_MM_OF_PAPER / pxPerMm;
  return (
    <TitleBlock>
      <Cell label="Designation" big>
        {shape ? shape.designation : <span className="font-regular text-ink-2">not named yet</span>}
      </Cell>
      <Cell label={<label htmlFor="drawing-name">Title</label>} fill>
        <input
          id="drawing-name"
          value={name}
          placeholder="give it a title"
          maxLength={120}
          autoComplete="off"
          onChange={(event) => act.set({ name: event.target.value })}
          className="h-6 w-full min-w-0 bg-transparent outline-offset-0 hover:bg-field"
        />
      </Cell>
      <Cell label="Bay" stays="md">
        {shape ? shape.bayName : "none, private"}
      </Cell>
      <Cell label="Revision" stays="always">
        {shape ? (
          <>
            <RevisionMark letter={shape.revision.letter} /> <StateChip state={shape.revision.state} />
          </>
        ) : (
          <StateChip state="draft" />
        )}
      </Cell>
      <Cell label="Drawn" stays="lg">
        {person}
      </Cell>
      <Cell label="Checked" stays="xl">
        {shape?.revision.checked ? shape.revision.checked.by.name : "not yet"}
      </Cell>
      <Cell label="Units" stays="lg">
        {settings.system === "metric" ? "mm, MPa" : "in, ksi"}
      </Cell>
      <Cell label="Scale" stays="md">
        <span className="font-num text-table">
          {scale === null ? "" : `1 : ${scale >= 10 ? scale.toFixed(0) : scale.toFixed(1)}`}
        </span>
      </Cell>
      <Cell label="Saved" stays="md">
        <span role="status" className="font-num text-table">
          {savedWords(saveState, savedAt)}
        </span>
      </Cell>
      <ActionCell>
        <FileMenu />
        <Actions shape={shape} />
      </ActionCell>
    </TitleBlock>
  );
};

const Actions = ({ shape }: { shape: ShapeLink | null }) => {
  const act = useBenchActions();
  const drawing = useBench((s) => s.history.now);
  const faults = useBench((s) => s.faults);
  const deeds = useRackDeeds();
  const [open, setOpen] = useState<"save" | "revision" | null>(null);
  const [busy, setBusy] = useState(false);
  const empty = drawing.parts.every((p) => p.cutout === true);
  const run = async (deed: () => Promise<unknown>, said: string) => {
    setBusy(true);
    try {
      await deed();
      act.say(said);
    } catch (cause) {
      act.set({ saveState: { kind: "refused", sentence: sentenceOf(cause) } });
    } finally {
      setBusy(false);
    }
  };
  const saved = (link: ShapeLink) => {
    setOpen(null);
    act.say(`${link.designation}, revision ${link.revision.letter}, is saved as a draft`);
  };
  const why = empty ? "Draw something first" : faults.length > 0 ? "Mend the drawing first" : undefined;
  const differs = shape !== null && differsFrom(shape, drawing);
  return (
    <>
      {shape === null && (
        <Button
          kind="main"
          className="max-sm:hidden"
          disabled={why !== undefined}
          title={why}
          onClick={() => setOpen("save")}
        >
          Save into a bay
        </Button>
      )}
      {shape?.revision.may.edit && (
        <Button
          disabled={!differs || busy || why !== undefined}
          title={differs ? why : "The draft holds what is drawn"}
          onClick={() => void run(() => deeds.saveDraft(shape), "The draft is saved")}
          className="max-lg:hidden"
        >
          Save the draft
        </Button>
      )}
      {shape?.revision.may.submit && (
        <Button
          kind="main"
          className="max-sm:hidden"
          atWork={busy}
          disabled={busy || why !== undefined}
          title={why}
          onClick={() => void run(() => deeds.submit(shape), `${shape.designation} is submitted`)}
        >
          Submit for release
        </Button>
      )}
      {shape !== null && !shape.revision.may.edit && (
        <Button
          kind="main"
          className="max-sm:hidden"
          disabled={!differs || why !== undefined}
          title={
            differs
              ? why
              : `Revision ${shape.revision.letter} is ${shape.revision.state}: change the drawing to make the next one`
          }
          onClick={() => setOpen("revision")}
        >
          Save as a revision
        </Button>
      )}
      {open === "save" && <SaveDialog onClose={() => setOpen(null)} onSaved={saved} />}
      {open === "revision" && shape && (
        <RevisionDialog link={shape} onClose={() => setOpen(null)} onSaved={saved} />
      )}
    </>
  );
};
