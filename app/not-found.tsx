import type { Metadata } from "next";
import Link from "next/link";
import { PlainSheet } from "@/components/sheet/plain-sheet";
import { buttonClass } from "@/components/ui/button";

export const metadata: Metadata = { title: "No such sheet" };

export default function NotFound() {
  return (
    <PlainSheet
      head="There is no such sheet in this book."
      actions={
        <Link href="/rack" className={buttonClass({ kind: "main" })}>
          To the Rack
        </Link>
      }
    >
      The address may be mistyped, or what stood here belongs to another organisation or was never released to
      you.
    </PlainSheet>
  );
}
