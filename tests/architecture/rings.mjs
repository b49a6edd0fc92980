// Who may import whom: the one table that the lint rules (eslint.config.mjs) and the graph check (graph.test.ts) read.
//
// `files`: where the ring lives; a file falls in exactly one. `sees`: the folders of ours it may import, itself included.
// `packages`: "any", or the packages it may import. `bans`: what the language must not reach for in there.

export const rings = [
  {
    name: "core",
    files: ["lib/core/**/*.ts"],
    ignores: ["lib/core/statistics/**"],
    sees: ["lib/core"],
    packages: ["zod"],
    bans: ["clock", "dice"],
  },
  {
    // Distributions to 14 figures are not written anew: pure functions of numbers, the same in every browser, and only here.
    name: "core's statistics",
    files: ["lib/core/statistics/**/*.ts"],
    sees: ["lib/core/statistics"],
    packages: [
      "@stdlib/math-base-special-betainc",
      "@stdlib/math-base-special-gammainc",
      "@stdlib/math-base-special-gammaincinv",
      "@stdlib/math-base-special-gammaln",
      "@stdlib/math-base-special-kernel-betaincinv",
    ],
    bans: ["clock", "dice"],
  },
  {
    name: "client",
    files: ["lib/client/**/*.{ts,tsx}"],
    sees: ["lib/client", "lib/core"],
    packages: ["zod", "idb", "fuse.js", "uuidv7", "react"],
    bans: ["server-import"],
  },
  {
    name: "schema and client",
    files: ["db/client.ts", "db/schema/**/*.ts"],
    sees: ["db", "lib/core"],
    packages: "any",
    bans: [],
  },
  {
    // The demo fleet is made by the commands people use.
    name: "database programs",
    files: ["db/*.ts", "db/demo/**/*.ts"],
    ignores: ["db/client.ts"],
    sees: ["db", "lib/core", "lib/server"],
    packages: "any",
    bans: [],
  },
  {
    name: "server",
    files: ["lib/server/**/*.{ts,tsx}"],
    sees: ["lib/server", "lib/core", "db"],
    packages: "any",
    bans: [],
  },
  {
    name: "ui",
    files: ["components/ui/**/*.{ts,tsx}"],
    sees: ["components/ui"],
    packages: ["react", "next", "clsx", "lucide-react"],
    bans: ["server-import"],
  },
  {
    name: "components",
    files: ["components/**/*.{ts,tsx}"],
    ignores: ["components/ui/**"],
    sees: ["components", "lib/core", "lib/client"],
    packages: [
      "react",
      "next",
      "radix-ui",
      "clsx",
      "lucide-react",
      "@xyflow/react",
      "elkjs",
      "react-hook-form",
      "@hookform/resolvers",
      "zod",
      "uuidv7",
    ],
    bans: ["server-import"],
  },
  {
    name: "flow",
    files: ["app/(flow)/**/*.{ts,tsx}"],
    sees: ["app", "components", "lib/core", "lib/client"],
    packages: ["react", "next"],
    bans: ["server-import"],
  },
  {
    name: "app",
    files: ["app/**/*.{ts,tsx}", "proxy.ts", "instrumentation.ts"],
    ignores: ["app/(flow)/**"],
    sees: ["app", "components", "lib/core", "lib/client", "lib/server"],
    packages: ["react", "next", "next-auth", "uuidv7", "zod", "@fontsource/b612-mono", "@fontsource-variable/atkinson-hyperlegible-next"],
    bans: [],
  },
];

/** All folders of ours that hold code with rings. */
export const rooms = ["app", "components", "db", "lib/client", "lib/core", "lib/server", "scripts", "tests", "trees"];
