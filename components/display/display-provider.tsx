"use client";
import {
  createContext,
  useCallback,
  useContext,
  useMemo,
  useState,
  useSyncExternalStore,
  type ReactNode,
} from "react";
import { DEFAULT_DISPLAY, type DisplaySettings } from "@/lib/units/settings";

type Display = Readonly<{
  settings: DisplaySettings;
  change: (next: DisplaySettings) => void;
  /** Why the last change was not kept with the person; it counts for this visit all the same. */
  notKept: string | null;
  /** Whether single letters act where no field has focus. */
  singleKeys: boolean;
  changeSingleKeys: (on: boolean) => void;
}>;

const DisplayContext = createContext<Display>({
  settings: DEFAULT_DISPLAY,
  change: () => undefined,
  notKept: null,
  singleKeys: true,
  changeSingleKeys: () => undefined,
});

const KEYS_STORE = "flitchbook.single-keys";
const listeners = new Set<() => void>();
const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};
const keysOn = () => window.localStorage.getItem(KEYS_STORE) !== "off";

type ProviderProps = Readonly<{
  initial: DisplaySettings;
  /** Keeps the settings with the person; its failure leaves them in force for this visit. */
  save?: (settings: DisplaySettings) => Promise<void>;
  children: ReactNode;
}>;

/** How this person sees figures: units, decimal mark, notation. Everything that shows a figure reads it here. */
export function DisplayProvider({ initial, save, children }: ProviderProps) {
  const [settings, setSettings] = useState(initial);
  const [notKept, setNotKept] = useState<string | null>(null);
  const singleKeys = useSyncExternalStore(subscribe, keysOn, () => true);
  const change = useCallback(
    (next: DisplaySettings) => {
      setSettings(next);
      setNotKept(null);
      save?.(next).catch((cause: unknown) =>
        setNotKept(cause instanceof Error ? cause.message : "The choice counts for this visit only."),
      );
    },
    [save],
  );
  const changeSingleKeys = useCallback((on: boolean) => {
    window.localStorage.setItem(KEYS_STORE, on ? "on" : "off");
    listeners.forEach((listener) => listener());
  }, []);
  const display = useMemo(
    () => ({ settings, change, notKept, singleKeys, changeSingleKeys }),
    [settings, change, notKept, singleKeys, changeSingleKeys],
  );
  return <DisplayContext.Provider value={display}>{children}</DisplayContext.Provider>;
}

export const useDisplay = (): Display => useContext(DisplayContext);
