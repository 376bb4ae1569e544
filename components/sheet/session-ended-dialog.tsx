"use client";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";

/** The way back in: to the sign-in page and then to this address. */
export default function SessionEndedDialog({ onClose }: { onClose: () => void }) {
  const leave = () => {
    const { pathname, search } = window.location;
    window.location.assign(`/sign-in?next=${encodeURIComponent(pathname + search)}`);
  };
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Your session has ended."
      text="Nothing more is saved until you sign in again. What is on this page stays while you leave it open."
      actions={
        <>
          <Button kind="main" onClick={leave}>
            Sign in again
          </Button>
          <Button onClick={onClose}>Stay here</Button>
        </>
      }
    />
  );
}
