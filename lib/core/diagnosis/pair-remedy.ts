import type { RemedyModel } from "./model";
import { alike, pairTable, type PairTable } from "./pair-table";

/** What trying a remedy comes to on an engine with both causes. */
export type PairCure = { readonly cured: number; readonly better: number; readonly noChange: number };

/** A pair is cured when both are, and better when one of them is. Rule [M3]. */
export function pairCure({ cure }: RemedyModel, a: number, b: number): PairCure {
  const [ofA, ofB] = [cure[a]!, cure[b]!];
  return { cured: ofA * ofB, better: ofA * (1 - ofB) + ofB * (1 - ofA), noChange: (1 - ofA) * (1 - ofB) };
}

/** Nothing that was seen is impossible. */
const HARDLY = 1e-9;

const kept = new WeakMap<RemedyModel, PairTable>();

/** ln of what "better, not cured" weighs for every pair. */
export function betterTable(remedy: RemedyModel): PairTable {
  const ready = kept.get(remedy);
  if (ready) return ready;
  const plain = alike(remedy.cure, remedy.cure.length - 1);
  const table = pairTable(plain, (a, b) => Math.log(Math.max(HARDLY, pairCure(remedy, a, b).better)));
  kept.set(remedy, table);
  return table;
}
