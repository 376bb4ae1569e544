"use client";
import { PlainSheet } from "@/components/sheet/plain-sheet";
import { Button } from "@/components/ui/button";

type ErrorPageProps = Readonly<{ error: Error & { digest?: string }; reset: () => void }>;

export default function ErrorPage({ error, reset }: ErrorPageProps) {
  return (
    <PlainSheet
      head="This sheet could not be drawn."
      actions={
        <>
          <Button kind="main" onClick={reset}>
            Try again
          </Button>
          <Button onClick={() => window.location.assign("/rack")}>To the Rack</Button>
        </>
      }
    >
      What is saved is safe. If it happens again, tell an admin
      {error.digest ? ` and give the number ${error.digest}.` : " what you were doing."}
    </PlainSheet>
  );
}
