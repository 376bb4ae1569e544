"use client";
import { useState } from "react";
import { queryOf, type RackSearch } from "@/components/rack/search-params";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { TextField } from "@/components/ui/field";
import { sentenceOf } from "@/lib/client/api";
import { useSaveSearch } from "@/lib/client/saved-searches";

type SaveSearchDialogProps = Readonly<{ search: RackSearch; onClose: () => void }>;

export default function SaveSearchDialog({ search, onClose }: SaveSearchDialogProps) {
  const save = useSaveSearch();
  const [name, setName] = useState("");
  const submit = () =>
    save.mutate(
      { name: name.trim(), query: new URLSearchParams(queryOf(search)).toString() },
      { onSuccess: onClose },
    );
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Save this search"
      text="It is kept with your account, with its ranges, families and order."
      actions={
        <>
          <Button kind="main" atWork={save.isPending} disabled={!name.trim()} onClick={submit}>
            Save
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </>
      }
    >
      <TextField
        label="Name"
        value={name}
        maxLength={60}
        autoFocus
        onChange={(event) => setName(event.target.value)}
        onKeyDown={(event) => event.key === "Enter" && name.trim() && submit()}
        error={save.isError ? sentenceOf(save.error) : null}
      />
    </Dialog>
  );
}
