"use client";
import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { Kbd } from "@/components/ui/marks";
import { FindSign } from "@/components/ui/signs";
import { useShortcut } from "@/components/sheet/use-shortcut";

/** Finds a designation or title on the Rack; F puts the cursor here, Enter finds, Escape leaves. */
export function FindField() {
  const router = useRouter();
  const input = useRef<HTMLInputElement>(null);
  const [text, setText] = useState("");
  useShortcut("f", (event) => {
    event.preventDefault();
    input.current?.focus();
    input.current?.select();
  });
  return (
    <form
      role="search"
      className="mr-[18px] flex h-7 w-[236px] min-w-0 items-center gap-2 self-center border-b border-edge px-0.5 text-table text-ink-2 focus-within:outline-2 focus-within:outline-offset-1 focus-within:outline-focus max-lg:w-[150px] max-md:hidden"
      onSubmit={(event) => {
        event.preventDefault();
        if (text.trim()) router.push(`/rack?q=${encodeURIComponent(text.trim())}`);
        input.current?.blur();
      }}
    >
      <FindSign />
      <input
        ref={input}
        type="search"
        name="q"
        value={text}
        onChange={(event) => setText(event.target.value)}
        onKeyDown={(event) => event.key === "Escape" && input.current?.blur()}
        aria-label="Find a designation or title"
        placeholder="Find a designation or title"
        autoComplete="off"
        spellCheck={false}
        className="h-full min-w-0 flex-1 appearance-none bg-transparent text-ink outline-none placeholder:text-ink-2"
      />
      <Kbd>F</Kbd>
    </form>
  );
}
