"use client";
import { useTheme } from "next-themes";
import { useState } from "react";
import { useSignOut } from "@/lib/client/session";
import { PersonFace } from "@/components/sheet/person-face";
import { useDisplay } from "@/components/display/display-provider";
import { Menu, MenuChoice, MenuItem, MenuRule } from "@/components/ui/menu";

export type PersonMenuProps = Readonly<{ name: string; role: string }>;

/** Who is here; units, notation, theme, keys; sign out. */
export default function PersonMenu({ name, role }: PersonMenuProps) {
  const { theme, setTheme } = useTheme();
  const { settings, singleKeys, change, notKept, changeSingleKeys } = useDisplay();
  const signOut = useSignOut();
  const [refused, setRefused] = useState<string | null>(null);
  return (
    <Menu align="end" defaultOpen trigger={<PersonFace name={name} role={role} />}>
      <MenuChoice
        label="Units"
        value={settings.system}
        onChange={(system) => change({ ...settings, system })}
        choices={[
          { value: "metric", label: "metric: mm, kg/m, MPa" },
          { value: "inch", label: "inch: in, lb/ft, ksi" },
        ]}
      />
      <MenuChoice
        label="Decimal mark"
        value={settings.decimal}
        onChange={(decimal) => change({ ...settings, decimal })}
        choices={[
          { value: ".", label: "point: 12.5" },
          { value: ",", label: "comma: 12,5" },
        ]}
      />
      <MenuRule />
      <MenuChoice
        label="Theme"
        value={theme ?? "system"}
        onChange={setTheme}
        choices={[
          { value: "system", label: "as the computer" },
          { value: "light", label: "paper" },
          { value: "dark", label: "night shift" },
        ]}
      />
      <MenuRule />
      <MenuChoice
        label="Single-letter keys"
        value={singleKeys ? "on" : "off"}
        onChange={(next) => changeSingleKeys(next === "on")}
        choices={[
          { value: "on", label: "act where no field has focus" },
          { value: "off", label: "do nothing" },
        ]}
      />
      <MenuRule />
      <MenuItem
        onSelect={(event) => {
          event.preventDefault();
          signOut().catch((cause: unknown) =>
            setRefused(cause instanceof Error ? cause.message : "It did not work."),
          );
        }}
      >
        Sign out
      </MenuItem>
      {(refused ?? notKept) && (
        <p role="alert" className="max-w-60 px-3 py-1 text-note text-oxide-ink">
          {refused ?? `Not kept for the next visit: ${notKept}`}
        </p>
      )}
    </Menu>
  );
}
