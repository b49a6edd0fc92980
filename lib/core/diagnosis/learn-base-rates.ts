import type { FaultTree, KnownCase } from "../tree/schema";
import { believe } from "./believe";
import { settingFor } from "./case-evidence";
import { compile } from "./compile";

/** How often a cause was found, beside how often the tree would expect it from the complaints alone. */
export type LearnedBase = {
  readonly cause: string;
  readonly times: number;
  readonly expected: number;
  /** The tree's weight for it times this is what the log would have it be, shrunk to the tree as a word worth ten cases is. */
  readonly factor: number;
  /** How unlikely a count so far from the expected, or farther, would be if the tree were right (Poisson, twice the smaller tail, at most 1). */
  readonly chance: number;
};

const WORTH = 10;

/**
 * Compares base rates with logged, proved outcomes: the expected count of a
 * cause is the sum of what the tree believes of it on each case's symptoms
 * alone. Causes with nothing to say (expected under 0.5 and never found) are
 * left out. Farthest from the tree first. Rule [V6].
 */
export function learnBaseRates(tree: FaultTree, cases: readonly KnownCase[]): LearnedBase[] {
  const expected = new Map<string, number>();
  const times = new Map<string, number>();
  for (const known of cases) {
    const model = compile(tree, settingFor(known, "mechanic"));
    const { shares } = believe(model, {
      symptoms: known.symptoms.map((symptom) => ({ symptom, present: true })),
      findings: [],
      remedies: [],
    });
    model.causes.forEach(({ key }, index) => expected.set(key, (expected.get(key) ?? 0) + (shares[index] ?? 0)));
    for (const cause of new Set(known.causes)) times.set(cause, (times.get(cause) ?? 0) + 1);
  }
  return tree.causes
    .map(({ key }) => ({ cause: key, times: times.get(key) ?? 0, expected: expected.get(key) ?? 0 }))
    .filter((one) => one.expected >= 0.5 || one.times > 0)
    .map((one) => ({ ...one, factor: (WORTH + one.times) / (WORTH + one.expected), chance: poissonChance(one.times, one.expected) }))
    .sort((a, b) => a.chance - b.chance || (a.cause < b.cause ? -1 : 1));
}

function poissonChance(times: number, expected: number): number {
  let term = Math.exp(-expected);
  let below = 0;
  for (let count = 0; count < times; count++) {
    below += term;
    term = (term * expected) / (count + 1);
  }
  const [atLeast, atMost] = [1 - below, below + term];
  return Math.min(1, 2 * Math.min(atLeast, atMost));
}
