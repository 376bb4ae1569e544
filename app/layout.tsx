import type { Metadata, Viewport } from "next";
import { headers } from "next/headers";
import type { ReactNode } from "react";
import { Providers } from "@/app/providers";
import { NONCE_HEADER } from "@/app/content-security";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Flitchbook", template: "%s · Flitchbook" },
  description: "The firm's book of cross-sections.",
  icons: { icon: "/logo.svg" },
  robots: { index: false, follow: false },
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#c6d0d6" },
    { media: "(prefers-color-scheme: dark)", color: "#0a0f13" },
  ],
};

// Reading the nonce makes every page dynamic: a static page would carry no nonce and lose all its scripts.
export default async function RootLayout({ children }: Readonly<{ children: ReactNode }>) {
  const nonce = (await headers()).get(NONCE_HEADER) ?? "";
  return (
    <html lang="en" suppressHydrationWarning>
      <body>
        <Providers nonce={nonce}>{children}</Providers>
      </body>
    </html>
  );
}
