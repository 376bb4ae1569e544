"use client";
import type { ReactNode } from "react";
import { DisplayProvider } from "@/components/display/display-provider";
import { SessionEnded } from "@/components/sheet/session-ended";
import { saveDisplay } from "@/lib/client/me";
import type { DisplaySettings } from "@/lib/units/settings";

type DeskProvidersProps = Readonly<{ display: DisplaySettings; children: ReactNode }>;

export const DeskProviders = ({ display, children }: DeskProvidersProps) => (
  <DisplayProvider initial={display} save={saveDisplay}>
    {children}
    <SessionEnded />
  </DisplayProvider>
);
