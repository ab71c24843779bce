import path from "node:path";

/** Headers for every answer. The photo route adds its own cache rules. */
const safetyHeaders = [
  { key: "X-Content-Type-Options", value: "nosniff" },
  { key: "Referrer-Policy", value: "same-origin" },
  { key: "X-Frame-Options", value: "DENY" },
  { key: "Permissions-Policy", value: "camera=(self), microphone=(), geolocation=()" },
];

/** @type {import("next").NextConfig} */
const config = {
  poweredByHeader: false,
  devIndicators: false,
  // A library file of 4 MB is looked at and brought in through a server action.
  experimental: { authInterrupts: true, serverActions: { bodySizeLimit: "5mb" } },
  reactStrictMode: true,
  // Types are checked by `npm run check` and `npm run verify`; a build need not do it a second time.
  typescript: { ignoreBuildErrors: true },
  turbopack: { root: path.resolve(".") },
  outputFileTracingExcludes: { "/*": ["./uploads/**/*", "./data/**/*", "./backups/**/*", "./tests/**/*"] },
  headers: async () => [{ source: "/:path*", headers: safetyHeaders }],
};

export default config;
