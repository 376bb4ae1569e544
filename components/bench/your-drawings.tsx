"use client";
import Link from "next/link";
import { Block } from "@/components/bench/panel/block";
import { savedWhen } from "@/components/bench/drawings-dialog";
import { Notice } from "@/components/ui/notice";
import { sentenceOf } from "@/lib/client/api";
import { useDrawings } from "@/lib/client/drawings";

/** The last drawings of one's own, on a sheet that is still empty. */
export const YourDrawings = () => {
  const list = useDrawings(8);
  const items = list.data?.items ?? [];
  return (
    <Block id="your-drawings" title="Your drawings" note="private until you save one into a bay">
      {list.isError && <Notice kind="lost" head={sentenceOf(list.error)} className="p-3" />}
      {list.isSuccess && items.length === 0 && (
        <p className="px-3 py-2 text-table text-ink-2">None yet. What you draw is kept here by itself.</p>
      )}
      <ul>
        {items.map((item) => (
          <li
            key={item.id}
            className="flex h-7 items-center gap-3 border-b border-rule px-3 text-table max-md:h-11"
          >
            <Link prefetch={false} href={`/bench/${item.id}`} className="link min-w-0 flex-1 truncate">
              {item.name}
            </Link>
            <span className="text-note text-ink-2">
              {item.parts === 1 ? "1 part" : `${item.parts} parts`}
            </span>
            <span className="font-num text-note text-ink-2">{savedWhen(item.updatedAt)}</span>
          </li>
        ))}
      </ul>
    </Block>
  );
};
