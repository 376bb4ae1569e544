"use client";
import { PlainSheet } from "@/components/sheet/plain-sheet";
import { Button } from "@/components/ui/button";
import "./globals.css";

type GlobalErrorProps = Readonly<{ error: Error & { digest?: string } }>;

export default function GlobalError({ error }: GlobalErrorProps) {
  return (
    <html lang="en" data-theme="paper">
      <body>
        <PlainSheet
          head="The book could not be opened."
          actions={
            <Button kind="main" onClick={() => window.location.reload()}>
              Load again
            </Button>
          }
        >
          What is saved is safe. If it happens again, tell an admin
          {error.digest ? ` and give the number ${error.digest}.` : " what you were doing."}
        </PlainSheet>
      </body>
    </html>
  );
}
