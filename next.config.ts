import type { NextConfig } from "next";

const config: NextConfig = {
  poweredByHeader: false,
  reactStrictMode: true,
  devIndicators: false,
  images: { unoptimized: true },
  serverExternalPackages: ["@libsql/client", "libsql", "@node-rs/argon2", "pino"],
};

export default config;
