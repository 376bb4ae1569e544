"use client";
import { useQueryClient } from "@tanstack/react-query";
import dynamic from "next/dynamic";
import { useEffect, useState } from "react";
import { ApiProblem } from "@/lib/client/api";

const endsSession = (cause: unknown): boolean => cause instanceof ApiProblem && cause.status === 401;

/** Says once that the session has ended; what stands on the page stays until its person leaves it. */
export function SessionEnded() {
  const client = useQueryClient();
  const [ended, setEnded] = useState(false);
  useEffect(() => {
    const offQueries = client.getQueryCache().subscribe((event) => {
      if (event.type === "updated" && event.action.type === "error" && endsSession(event.action.error))
        setEnded(true);
    });
    const offMutations = client.getMutationCache().subscribe((event) => {
      if (event.type === "updated" && event.action.type === "error" && endsSession(event.action.error))
        setEnded(true);
    });
    return () => {
      offQueries();
      offMutations();
    };
  }, [client]);
  return ended ? <SessionEndedDialog onClose={() => setEnded(false)} /> : null;
}

const SessionEndedDialog = dynamic(() => import("@/components/sheet/session-ended-dialog"), { ssr: false });
