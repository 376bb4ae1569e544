"use client";
import { useRouter } from "next/navigation";
import { useShortcut } from "@/components/sheet/use-shortcut";
import type { FinderRow } from "@/lib/schemas/find-shapes";

type RackKeys = Readonly<{
  rows: readonly FinderRow[];
  inHand: string | null;
  onTakeInHand: (id: string | null) => void;
  onOpen: (id: string) => void;
  onCompare: (id: string) => void;
}>;

/** Rows by keyboard: arrows move, Enter opens, Escape leaves, C compares, B copies to the Bench. */
export function useRackKeys({ rows, inHand, onTakeInHand, onOpen, onCompare }: RackKeys): void {
  const router = useRouter();
  const index = rows.findIndex((row) => row.id === inHand);
  const move = (to: (index: number) => number) => (event: KeyboardEvent) => {
    const next = rows[Math.max(0, Math.min(rows.length - 1, to(index)))];
    if (!next) return;
    event.preventDefault();
    onTakeInHand(next.id);
    // The row may be mounted by the move itself: focus follows once it stands.
    requestAnimationFrame(() =>
      requestAnimationFrame(() =>
        document
          .querySelector<HTMLElement>(`[data-row="${CSS.escape(next.id)}"]`)
          ?.focus({ preventScroll: true }),
      ),
    );
  };
  const onControl = (event: KeyboardEvent) =>
    event.target instanceof Element && event.target.closest("a, button, summary") !== null;

  useShortcut(
    "ArrowDown",
    move((i) => i + 1),
  );
  useShortcut(
    "ArrowUp",
    move((i) => (i < 0 ? 0 : i - 1)),
  );
  useShortcut(
    "PageDown",
    move((i) => i + 15),
  );
  useShortcut(
    "PageUp",
    move((i) => i - 15),
  );
  useShortcut(
    "Home",
    move(() => 0),
  );
  useShortcut(
    "End",
    move(() => rows.length - 1),
  );
  useShortcut("Enter", (event) => {
    if (inHand !== null && !onControl(event)) onOpen(inHand);
  });
  useShortcut("Escape", () => onTakeInHand(null), inHand !== null);
  useShortcut("c", () => inHand !== null && onCompare(inHand));
  useShortcut("b", () => {
    if (inHand !== null) router.push(`/bench?shape=${inHand}`);
  });
}
