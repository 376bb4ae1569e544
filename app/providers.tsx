"use client";
import { QueryClientProvider } from "@tanstack/react-query";
import { setNonce } from "get-nonce";
import { ThemeProvider } from "next-themes";
import { NuqsAdapter } from "nuqs/adapters/next/app";
import { useState, type ReactNode } from "react";
import { makeQueryClient } from "@/lib/client/query-client";

/** The policy allows no code made of text, which zod probes for: it is told before any schema is made, without loading it. */
Object.assign(globalThis, { __zod_globalConfig: { jitless: true } });

type ProvidersProps = Readonly<{ nonce: string; children: ReactNode }>;

/** What every page stands in: theme, the cache of what was fetched, state in the address, the nonce for Radix. */
export function Providers({ nonce, children }: ProvidersProps) {
  const [client] = useState(makeQueryClient);
  setNonce(nonce);
  return (
    <ThemeProvider
      nonce={nonce}
      attribute="data-theme"
      themes={["light", "dark"]}
      value={{ light: "paper", dark: "night-shift" }}
      defaultTheme="system"
      enableColorScheme={false}
      storageKey="flitchbook.theme"
    >
      <QueryClientProvider client={client}>
        <NuqsAdapter>{children}</NuqsAdapter>
      </QueryClientProvider>
    </ThemeProvider>
  );
}
