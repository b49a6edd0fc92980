import { believe } from "@/lib/core/diagnosis/believe";
import { compile } from "@/lib/core/diagnosis/compile";
import type { Evidence } from "@/lib/core/diagnosis/evidence";
import type { Model } from "@/lib/core/diagnosis/model";
import { nextStep } from "@/lib/core/diagnosis/next-step";
import { pairShare } from "@/lib/core/diagnosis/pair-finding";
import { likeliestPairs } from "@/lib/core/diagnosis/pairs";
import { TWO_FROM } from "@/lib/core/diagnosis/possible";
import { dice, placeOf, seedAt } from "../../support/dice";
import { shippedTree } from "../../support/shipped-tree";

export type TwoFaultTask = { readonly kind: "two-faults"; readonly from: number; readonly to: number; readonly seed: number };

/** One run, by the planner that knows of pairs and by the one that does not. */
export type TwoFaultRun = {
  readonly faults: 1 | 2;
  /** "Perhaps two faults" was said at some step; and was it while both were there? */
  readonly said: boolean;
  readonly cured: { readonly two: boolean; readonly one: boolean };
  readonly minutes: { readonly two: number; readonly one: number };
};

const STEPS_MOST = 400;
/** Sets the two causes' rolls for one remedy apart. */
const APART = 0.618;

/** Engines with two faults and with one, turn about, on the shipped tree: drawn as its numbers say, a mechanic alongside. */
export async function twoFaultRuns({ from, to, seed }: TwoFaultTask): Promise<TwoFaultRun[]> {
  const tree = await shippedTree();
  const modelFor = (faults: "one" | "two"): Model =>
    compile(tree, { profile: { features: {}, figures: {}, healthy: {} }, situation: "alongside", person: "mechanic", faults });
  const [two, one] = [modelFor("two"), modelFor("one")];
  return Array.from({ length: to - from }, (_, place): TwoFaultRun => {
    const { roll } = dice(seedAt(seed, from + place));
    const sums = tree.symptoms.map(({ key }) =>
      two.logPrior.reduce((sum, log, index) => sum + (index < two.unknownAt ? Math.exp(log) * two.symptoms.get(key)![index]! : 0), 0),
    );
    const begin: Evidence = {
      symptoms: [{ symptom: tree.symptoms[placeOf(sums, roll())]!.key, present: true }],
      findings: [],
      remedies: [],
    };
    const belief = believe(two, begin);
    const pairs = likeliestPairs(belief.pairs, two.unknownAt, 0);
    const faults = (from + place) % 2 === 0 ? 2 : 1;
    const pair =
      pairs[
        placeOf(
          pairs.map(({ share }) => share),
          roll(),
        )
      ]!;
    const causes = faults === 2 ? [pair.a, pair.b] : [placeOf(belief.alone.subarray(0, two.unknownAt), roll())];
    const luck = { checks: Float64Array.from(two.checks, roll), remedies: Float64Array.from(two.remedies, roll) };
    const withTwo = playThrough(two, begin, causes, luck);
    const withOne = playThrough(one, begin, causes, luck);
    return {
      faults,
      said: withTwo.said,
      cured: { two: withTwo.cured, one: withOne.cured },
      minutes: { two: withTwo.minutes, one: withOne.minutes },
    };
  });
}

type Luck = { readonly checks: Float64Array; readonly remedies: Float64Array };

function playThrough(model: Model, begin: Evidence, causes: readonly number[], luck: Luck) {
  let open = causes;
  let evidence = begin;
  let minutes = 0;
  let said = false;
  for (let turn = 0; turn < STEPS_MOST; turn++) {
    if (open.length === causes.length && model.pairs) said ||= believe(model, evidence).two > TWO_FROM;
    const step = nextStep(model, evidence);
    minutes += step.minutes;
    if (step.kind === "call") return { cured: false, minutes, said };
    const left = open.length < causes.length && model.pairs ? { left: true as const } : {};
    if (step.kind === "check") {
      const at = model.checkAt.get(step.key)!;
      const { rows, check } = model.checks[at]!;
      const row = rows.map((of, finding) =>
        open.length === 2 ? pairShare(model.checks[at]!, finding, open[0]!, open[1]!) : of[open[0]!]!,
      );
      const finding = check.findings[placeOf(row, luck.checks[at]!)]!.key;
      evidence = { ...evidence, findings: [...evidence.findings, { check: step.key, finding, ...left }] };
      continue;
    }
    const at = model.remedyAt.get(step.key)!;
    // One roll a remedy and cause, so that both planners meet the same luck.
    const stays = open.filter((cause) => (luck.remedies[at]! + causes.indexOf(cause) * APART) % 1 >= model.remedies[at]!.cure[cause]!);
    if (stays.length === 0) return { cured: true, minutes, said };
    const better = stays.length < open.length;
    open = stays;
    const remedies = [...evidence.remedies, { remedy: step.key, result: better ? ("better" as const) : ("no-change" as const), ...left }];
    evidence = { ...evidence, remedies, ...(better && model.pairs ? { curedOne: step.key } : {}) };
  }
  throw new Error("a run did not end");
}
