"use client";
import { useQueryClient } from "@tanstack/react-query";
import { useCallback } from "react";
import { api } from "@/lib/client/api";

/** Ends the session on the server, empties what the browser cached and kept unsaved, and leaves with a full page load. */
export function useSignOut(): () => Promise<void> {
  const cache = useQueryClient();
  return useCallback(async () => {
    await api.delete("/session");
    cache.clear();
    const { emptyJournal } = await import("@/lib/client/journal");
    await emptyJournal();
    window.location.assign("/sign-in");
  }, [cache]);
}
