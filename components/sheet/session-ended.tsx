"use client";
import { useQueryClient } from "@tanstack/react-query";
import { useEffect, useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
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
  const leave = () => {
    const { pathname, search } = window.location;
    window.location.assign(`/sign-in?next=${encodeURIComponent(pathname + search)}`);
  };
  return (
    <Dialog
      open={ended}
      onOpenChange={setEnded}
      title="Your session has ended."
      text="Nothing more is saved until you sign in again. What is on this page stays while you leave it open."
      actions={
        <>
          <Button kind="main" onClick={leave}>
            Sign in again
          </Button>
          <Button onClick={() => setEnded(false)}>Stay here</Button>
        </>
      }
    />
  );
}
