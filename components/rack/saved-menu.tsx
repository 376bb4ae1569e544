"use client";
import { Button } from "@/components/ui/button";
import { Menu, MenuItem, MenuRule } from "@/components/ui/menu";
import { useForgetSearch } from "@/lib/client/saved-searches";
import type { SavedSearch } from "@/lib/client/saved-searches";

type SavedMenuProps = Readonly<{ items: readonly SavedSearch[]; onOpen: (query: string) => void }>;

export default function SavedMenu({ items, onOpen }: SavedMenuProps) {
  const forget = useForgetSearch();
  return (
    <Menu
      align="end"
      defaultOpen
      trigger={
        <Button size="small" kind="plain">
          Saved
        </Button>
      }
    >
      {items.map((item) => (
        <MenuItem key={item.id} onSelect={() => onOpen(item.query)}>
          {item.name}
        </MenuItem>
      ))}
      <MenuRule />
      {items.map((item) => (
        <MenuItem key={item.id} className="text-ink-2" onSelect={() => forget.mutate(item)}>
          Forget “{item.name}”
        </MenuItem>
      ))}
    </Menu>
  );
}
