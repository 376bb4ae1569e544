"use client";
import { useId, useState } from "react";
import { cx } from "@/components/ui/cx";
import { fieldClass } from "@/components/ui/field";

type TextFilterProps = Readonly<{
  label: string;
  value: string | null;
  onCommit: (value: string | null) => void;
  placeholder?: string;
  className?: string;
}>;

/** A text that narrows the search: taken on Enter and on leaving the field, dropped with Escape. */
export function TextFilter({ label, value, onCommit, placeholder, className }: TextFilterProps) {
  const id = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const commit = () => {
    if (typed === null) return;
    onCommit(typed.trim() || null);
    setTyped(null);
  };
  return (
    <div className={className}>
      <label
        htmlFor={id}
        className={cx("mb-0.5 block text-micro", value ? "font-[600] text-ink" : "text-ink-2")}
      >
        {label}
      </label>
      <input
        id={id}
        value={typed ?? value ?? ""}
        placeholder={placeholder}
        maxLength={60}
        autoComplete="off"
        spellCheck={false}
        onChange={(event) => setTyped(event.target.value)}
        onBlur={commit}
        onKeyDown={(event) => {
          if (event.key === "Enter") commit();
          if (event.key === "Escape" && typed !== null) {
            event.stopPropagation();
            setTyped(null);
          }
        }}
        className={cx(fieldClass({ set: !!value }), "h-6 w-[104px] text-table max-md:h-11 max-md:w-full")}
      />
    </div>
  );
}
