import { readFileSync } from "node:fs";
import path from "node:path";

/** What the seed of this run said of the people it made; written by scripts/test.mjs. */
export type DemoPerson = { email: string; roles: string[]; fleet: string };

const run = process.env.RUN_DIR ?? ".data/manual";
export const demo = (): { password: string; people: DemoPerson[] } => JSON.parse(readFileSync(path.join(run, "demo.json"), "utf8"));
export const stateOf = (email: string): string => path.join(run, `state-${email}.json`);
