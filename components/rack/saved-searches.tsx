"use client";
import dynamic from "next/dynamic";
import { useState } from "react";
import type { RackSearch } from "@/components/rack/search-params";
import { Button } from "@/components/ui/button";
import { useSavedSearches } from "@/lib/client/saved-searches";

type SavedSearchesProps = Readonly<{ search: RackSearch; onOpen: (query: string) => void }>;

/** Searches kept under a name. The menu and the dialog are fetched when they are wanted. */
export function SavedSearches({ search, onOpen }: SavedSearchesProps) {
  const saved = useSavedSearches();
  const [naming, setNaming] = useState(false);
  const [menu, setMenu] = useState(false);
  const items = saved.data ?? [];
  return (
    <>
      {items.length > 0 &&
        (menu ? (
          <SavedMenu items={items} onOpen={onOpen} />
        ) : (
          <Button size="small" kind="plain" aria-haspopup="menu" onClick={() => setMenu(true)}>
            Saved
          </Button>
        ))}
      <Button size="small" onClick={() => setNaming(true)}>
        Save this search
      </Button>
      {naming && <SaveSearchDialog search={search} onClose={() => setNaming(false)} />}
    </>
  );
}

const SavedMenu = dynamic(() => import("@/components/rack/saved-menu"), { ssr: false });
const SaveSearchDialog = dynamic(() => import("@/components/rack/save-search-dialog"), { ssr: false });
