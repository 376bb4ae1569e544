"use client";
import { useShortcut } from "@/components/sheet/use-shortcut";
import type { RowSummary } from "@/lib/schemas/delivery";

type RowKeys = Readonly<{
  rows: readonly RowSummary[];
  inHand: number | null;
  onTake: (row: number) => void;
}>;

/** Rows by keyboard: arrows move by one, page keys by fifteen. */
export function useRowKeys({ rows, inHand, onTake }: RowKeys): void {
  const at = rows.findIndex((row) => row.number === inHand);
  const move = (to: (index: number) => number) => (event: KeyboardEvent) => {
    const next = rows[Math.max(0, Math.min(rows.length - 1, to(at)))];
    if (next === undefined) return;
    event.preventDefault();
    onTake(next.number);
    requestAnimationFrame(() =>
      requestAnimationFrame(() =>
        document.querySelector<HTMLElement>(`[data-row="${next.number}"]`)?.focus({ preventScroll: true }),
      ),
    );
  };
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
}
