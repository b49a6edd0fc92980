import { ESLint } from "eslint";
import { beforeAll, describe, expect, test } from "vitest";

/** Breaches planted one by one: each must be reported by the rule that guards its fence. */
const BREACHES: [title: string, file: string, code: string, rule: string][] = [
  ["core reads the clock", "lib/core/diagnosis/planted.ts", "export const now = () => Date.now();", "no-restricted-syntax"],
  ["core makes a date of now", "lib/core/diagnosis/planted.ts", "export const now = () => new Date();", "no-restricted-syntax"],
  ["core throws dice", "lib/core/diagnosis/planted.ts", "export const roll = () => Math.random();", "no-restricted-syntax"],
  [
    "core imports the server",
    "lib/core/diagnosis/planted.ts",
    'import { a } from "@/lib/server/auth/scope"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "core imports the server by dots",
    "lib/core/diagnosis/planted.ts",
    'import { a } from "../../../db/client"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "core imports React",
    "lib/core/diagnosis/planted.ts",
    'import { useState } from "react"; export const b = useState;',
    "no-restricted-imports",
  ],
  [
    "core imports Node",
    "lib/core/diagnosis/planted.ts",
    'import { readFileSync } from "node:fs"; export const b = readFileSync;',
    "no-restricted-imports",
  ],
  [
    "client imports the server",
    "lib/client/planted.ts",
    'import { a } from "@/lib/server/web/endpoint"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "client imports the server later",
    "lib/client/planted.ts",
    'export const b = () => import("@/lib/server/web/endpoint");',
    "no-restricted-syntax",
  ],
  [
    "ui imports another component",
    "components/ui/planted.tsx",
    'import { a } from "@/components/diagnosis/step"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "ui imports the core",
    "components/ui/planted.tsx",
    'import { a } from "@/lib/core/units/units"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "a component imports the server",
    "components/fleet/planted.tsx",
    'import { a } from "@/lib/server/boats/queries"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "a component imports the database's client",
    "components/fleet/planted.tsx",
    'import { a } from "drizzle-orm"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "a page imports the database",
    "app/(app)/planted/page.tsx",
    'import { a } from "@/db/client"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "the skipper's surface imports the server",
    "app/(flow)/diagnose/planted.tsx",
    'import { a } from "@/lib/server/boats/queries"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "the server imports a page",
    "lib/server/boats/planted.ts",
    'import { a } from "@/app/layout"; export const b = a;',
    "no-restricted-imports",
  ],
  [
    "the schema imports a command",
    "db/schema/planted.ts",
    'import { a } from "@/lib/server/boats/commands"; export const b = a;',
    "no-restricted-imports",
  ],
  ["a barrel", "lib/server/boats/planted.ts", 'export * from "./queries";', "no-restricted-syntax"],
];

const SOUND: [title: string, file: string, code: string][] = [
  [
    "core imports itself and zod",
    "lib/core/diagnosis/planted.ts",
    'import * as z from "zod"; import { Key } from "../tree/schema"; export const b = z.array(Key);',
  ],
  ["a page imports a query", "app/(app)/planted/page.tsx", 'import { a } from "@/lib/server/boats/queries"; export const b = a;'],
  [
    "a component imports ui and core",
    "components/fleet/planted.tsx",
    'import { a } from "@/components/ui/button"; import { c } from "@/lib/core/units/units"; export const b = [a, c];',
  ],
  ["the seed calls a command", "db/seed.ts", 'import { a } from "@/lib/server/boats/commands"; export const b = a;'],
];

describe("the fences between the rings", () => {
  let eslint: ESLint;
  beforeAll(() => {
    eslint = new ESLint();
  });
  const rulesBroken = async (file: string, code: string) => {
    const [result] = await eslint.lintText(code, { filePath: file });
    return result!.messages.map((m) => m.ruleId);
  };
  test.each(BREACHES)("%s: refused", async (_title, file, code, rule) => {
    expect(await rulesBroken(file, code)).toContain(rule);
  });
  test.each(SOUND)("%s: allowed", async (_title, file, code) => {
    const broken = await rulesBroken(file, code);
    expect(broken).not.toContain("no-restricted-imports");
    expect(broken).not.toContain("no-restricted-syntax");
  });
});
