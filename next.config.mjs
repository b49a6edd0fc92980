/** @type {import("next").NextConfig} */
const config = {
  output: "standalone",
  // A lock file in a folder above would otherwise become the root, and the standalone build land in a subfolder.
  outputFileTracingRoot: import.meta.dirname,
  turbopack: { root: import.meta.dirname },
  poweredByHeader: false,
  reactStrictMode: true,
  // `npm test` runs tsc before it builds: not a second time then.
  typescript: { ignoreBuildErrors: process.env.TYPES_CHECKED === "1" },
  agentRules: false,
  serverExternalPackages: ["pg", "graphile-worker", "nodemailer", "@node-rs/argon2", "sharp"],
  experimental: { agentUpgrade: false },
  // The proxy does not see static files.
  headers: async () => [{ source: "/_next/static/:path*", headers: [{ key: "X-Content-Type-Options", value: "nosniff" }] }],
};

export default config;
