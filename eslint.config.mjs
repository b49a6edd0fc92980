import { defineConfig, globalIgnores } from "eslint/config";
import nextVitals from "eslint-config-next/core-web-vitals";
import nextTs from "eslint-config-next/typescript";
import { ringBlocks } from "./tests/architecture/lint-rules.mjs";

export default defineConfig([
  globalIgnores([".next/**", ".data/**", "coverage/**", "next-env.d.ts", "drizzle/**"]),
  ...nextVitals,
  ...nextTs,
  {
    rules: {
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_" }],
      "@typescript-eslint/consistent-type-imports": ["error", { fixStyle: "inline-type-imports", disallowTypeAnnotations: false }],
      "@typescript-eslint/no-explicit-any": "error",
      eqeqeq: "error",
    },
  },
  {
    files: ["{app,components,db,lib}/**/*.{ts,tsx}", "scripts/**/*.{mjs,ts}"],
    rules: { "max-lines": ["error", { max: 300, skipBlankLines: true, skipComments: true }] },
  },
  ...ringBlocks,
]);
