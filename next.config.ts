import type { NextConfig } from "next";

const SECURITY_HEADERS = [
  { key: "X-Content-Type-Options", value: "nosniff" },
  { key: "Referrer-Policy", value: "strict-origin-when-cross-origin" },
  { key: "X-Frame-Options", value: "DENY" },
  { key: "Permissions-Policy", value: "camera=(), microphone=(), geolocation=()" },
  { key: "Strict-Transport-Security", value: "max-age=63072000; includeSubDomains" },
  { key: "Cross-Origin-Opener-Policy", value: "same-origin" },
];

const config: NextConfig = {
  reactCompiler: true,
  poweredByHeader: false,
  productionBrowserSourceMaps: false,
  images: { unoptimized: true },
  serverExternalPackages: ["@node-rs/argon2", "postgres", "pg", "pg-boss", "rate-limiter-flexible"],
  experimental: { authInterrupts: true, serverActions: { bodySizeLimit: "1mb" } },
  headers: () => Promise.resolve([{ source: "/:path*", headers: SECURITY_HEADERS }]),
};

export default config;
