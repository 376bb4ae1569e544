"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { queryOf, type RackSearch } from "@/components/rack/search-params";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { TextField } from "@/components/ui/field";
import { Menu, MenuItem, MenuRule } from "@/components/ui/menu";
import { api, sentenceOf } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";

/** A search under a name: the query string of the Rack, kept on the server with the person. */
type SavedSearch = Readonly<{ id: string; name: string; query: string; version: number }>;
type SavedSearchesProps = Readonly<{ search: RackSearch; onOpen: (query: string) => void }>;

export function SavedSearches({ search, onOpen }: SavedSearchesProps) {
  const cache = useQueryClient();
  const [naming, setNaming] = useState(false);
  const [name, setName] = useState("");
  const saved = useQuery({
    queryKey: queryKeys.savedSearches(),
    queryFn: async ({ signal }) =>
      (await api.get<{ items: readonly SavedSearch[] }>("/saved-searches", { signal })).data.items,
  });
  const forget = () => cache.invalidateQueries({ queryKey: queryKeys.savedSearches() });
  const save = useMutation({
    mutationFn: () =>
      api.post("/saved-searches", { body: { name, query: new URLSearchParams(queryOf(search)).toString() } }),
    onSuccess: async () => {
      setNaming(false);
      setName("");
      await forget();
    },
  });
  const remove = useMutation({
    mutationFn: (item: SavedSearch) =>
      api.delete(`/saved-searches/${item.id}`, { ifMatch: `"${item.version}"` }),
    onSuccess: forget,
  });

  return (
    <>
      {(saved.data?.length ?? 0) > 0 && (
        <Menu
          align="end"
          trigger={
            <Button size="small" kind="plain">
              Saved
            </Button>
          }
        >
          {saved.data?.map((item) => (
            <MenuItem key={item.id} onSelect={() => onOpen(item.query)}>
              {item.name}
            </MenuItem>
          ))}
          <MenuRule />
          {saved.data?.map((item) => (
            <MenuItem key={item.id} className="text-ink-2" onSelect={() => remove.mutate(item)}>
              Forget “{item.name}”
            </MenuItem>
          ))}
        </Menu>
      )}
      <Button size="small" onClick={() => setNaming(true)}>
        Save this search
      </Button>
      <Dialog
        open={naming}
        onOpenChange={setNaming}
        title="Save this search"
        text="It is kept with your account, with its ranges, families and order."
        actions={
          <>
            <Button kind="main" atWork={save.isPending} disabled={!name.trim()} onClick={() => save.mutate()}>
              Save
            </Button>
            <Button onClick={() => setNaming(false)}>Leave it</Button>
          </>
        }
      >
        <TextField
          label="Name"
          value={name}
          maxLength={80}
          autoFocus
          onChange={(event) => setName(event.target.value)}
          onKeyDown={(event) => event.key === "Enter" && name.trim() && save.mutate()}
          error={save.isError ? sentenceOf(save.error) : null}
        />
      </Dialog>
    </>
  );
}
