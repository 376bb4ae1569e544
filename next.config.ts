import type { NextConfig } from "next";

const EVERYWHERE = [
  { key: "X-Content-Type-Options", value: "nosniff" },
  { key: "Referrer-Policy", value: "same-origin" },
  { key: "X-Frame-Options", value: "DENY" },
  { key: "Cross-Origin-Opener-Policy", value: "same-origin" },
  { key: "Cross-Origin-Resource-Policy", value: "same-origin" },
  { key: "Permissions-Policy", value: "camera=(), geolocation=(), microphone=(), payment=(), usb=()" },
];
// A worker takes the policy of its own file, so files may load scripts from here; answers of routes may load nothing.
const FILES = "default-src 'self'; object-src 'none'; base-uri 'none'; frame-ancestors 'none'";
const ROUTES = "default-src 'none'; style-src 'unsafe-inline'; sandbox; frame-ancestors 'none'";

const config: NextConfig = {
  poweredByHeader: false,
  // The tests hold the types; a start need not check them again.
  typescript: { ignoreBuildErrors: true },
  reactStrictMode: true,
  devIndicators: false,
  images: { unoptimized: true },
  serverExternalPackages: [
    "@libsql/client",
    "libsql",
    "@node-rs/argon2",
    "pino",
    "nodemailer",
    "smtp-server",
  ],
  headers: async () => [
    { source: "/:path*", headers: EVERYWHERE },
    { source: "/_next/:path*", headers: [{ key: "Content-Security-Policy", value: FILES }] },
    { source: "/:file(logo.svg|favicon.ico)", headers: [{ key: "Content-Security-Policy", value: FILES }] },
    { source: "/api/:path*", headers: [{ key: "Content-Security-Policy", value: ROUTES }] },
  ],
};

export default config;
