import { believe } from "@/lib/core/diagnosis/believe";
import { compile } from "@/lib/core/diagnosis/compile";
import { NO_EVIDENCE, type Evidence } from "@/lib/core/diagnosis/evidence";
import type { Model } from "@/lib/core/diagnosis/model";
import { nextStep } from "@/lib/core/diagnosis/next-step";
import { dice, placeOf, seedAt } from "../../support/dice";
import { madeModel } from "../../support/made-model";
import { modelOf } from "../../support/plain-model";
import { shippedTree } from "../../support/shipped-tree";
import { atMost, type Figure } from "./figures";

const STEPS_MOST = 12;
const REPEATS = 40;
const BARS = { nextStepMs: 10, updateUs: 50, updatePairsMs: 2 };

/** The best of so many: what else the machine does in between is not ours. */
const TURNS = 5;

function bestMs(work: () => void): number {
  let best = Infinity;
  for (let turn = 0; turn < TURNS; turn++) {
    const start = performance.now();
    work();
    best = Math.min(best, performance.now() - start);
  }
  return best;
}

/** The states of knowledge that a run comes through: a cause drawn, findings drawn from its rows, no remedy helps. */
function met(model: Model, begin: Evidence, roll: () => number): Evidence[] {
  const truth = placeOf(believe(model, begin).shares, roll());
  const all = [begin];
  for (let evidence = begin; all.length <= STEPS_MOST; all.push(evidence)) {
    const { kind, key } = nextStep(model, evidence);
    if (kind === "call") break;
    if (kind === "remedy") evidence = { ...evidence, remedies: [...evidence.remedies, { remedy: key, result: "no-change" }] };
    else {
      const { rows, check } = model.checks[model.checkAt.get(key)!]!;
      const finding = placeOf(
        rows.map((row) => row[truth]!),
        roll(),
      );
      evidence = { ...evidence, findings: [...evidence.findings, { check: key, finding: check.findings[finding]!.key }] };
    }
  }
  return all;
}

const quantile = (values: readonly number[], share: number): number =>
  [...values].sort((a, b) => a - b)[Math.min(values.length - 1, Math.floor(share * values.length))] ?? NaN;

function stepTimes(model: Model, begins: readonly Evidence[], seed: number): number[] {
  const { roll } = dice(seed);
  const states = begins.flatMap((begin) => met(model, begin, roll));
  return states.map((evidence) => bestMs(() => nextStep(model, evidence)));
}

const updateMs = (model: Model, evidence: Evidence): number =>
  bestMs(() => {
    for (let repeat = 0; repeat < REPEATS; repeat++) believe(model, evidence);
  }) / REPEATS;

/** How long the next step and an update take, by size and on the shipped tree; best of several each. */
export async function timeFigures(seed: number, runs: number): Promise<Figure[]> {
  const figures: Figure[] = [];
  const sizes = [
    { name: "30", causes: 30, checks: 30, runs },
    { name: "110", causes: 110, checks: 110, runs },
    { name: "200", causes: 200, checks: 150, runs: 2 * runs },
    { name: "300", causes: 300, checks: 300, runs },
    { name: "1000", causes: 1000, checks: 1000, runs: Math.ceil(runs / 4) },
  ];
  const medians: { causes: number; ms: number }[] = [];
  for (const { name, causes, checks, runs } of sizes) {
    const model = modelOf(madeModel(causes, checks, seedAt(seed, causes)));
    const times = stepTimes(
      model,
      Array.from({ length: runs }, () => NO_EVIDENCE),
      seed,
    );
    medians.push({ causes, ms: quantile(times, 0.5) });
    figures.push(
      atMost(`nextStep.p50Ms.${name}`, quantile(times, 0.5), null, `${causes} causes, ${checks} checks, ${times.length} steps`),
      atMost(`nextStep.p99Ms.${name}`, quantile(times, 0.99), name === "200" ? BARS.nextStepMs : null),
    );
  }
  figures.push(
    atMost(
      "growth.exponent",
      slope(medians.map(({ causes, ms }) => [Math.log(causes), Math.log(ms)])),
      null,
      "of the median next step, with as many checks as causes",
    ),
  );
  const tree = await shippedTree();
  for (const faults of ["one", "two"] as const) {
    const model = compile(tree, {
      profile: { features: {}, figures: {}, healthy: {} },
      situation: "alongside",
      person: "mechanic",
      faults,
    });
    const { below, roll } = dice(seed);
    const begins = Array.from({ length: 2 * runs }, (): Evidence => ({
      ...NO_EVIDENCE,
      symptoms: [{ symptom: tree.symptoms[below(tree.symptoms.length)]!.key, present: true }],
    }));
    const states = begins.flatMap((begin) => met(model, begin, roll));
    const times = states.map((evidence) => bestMs(() => nextStep(model, evidence)));
    const name = faults === "one" ? "shipped" : "shipped.pairs";
    const on = `${model.causes.length} causes, ${model.checks.length} checks, ${times.length} steps`;
    figures.push(
      atMost(`nextStep.p50Ms.${name}`, quantile(times, 0.5), null, on),
      atMost(`nextStep.p99Ms.${name}`, quantile(times, 0.99), faults === "one" ? BARS.nextStepMs : null),
    );
    const updates = states.slice(0, runs * 4).map((evidence) => updateMs(model, evidence));
    if (faults === "one")
      figures.push(atMost("belief.updateUs", quantile(updates, 0.5) * 1000, BARS.updateUs, "the shipped tree, all that is known afresh"));
    else
      figures.push(
        atMost("belief.updateAllPairsMs", quantile(updates, 0.5), BARS.updatePairsMs, "the shipped tree, all that is known afresh"),
      );
  }
  return figures;
}

/** Of a straight line through points. */
function slope(points: readonly (readonly [number, number])[]): number {
  const [x, y] = [0, 1].map((part) => points.reduce((sum, point) => sum + point[part]!, 0) / points.length) as [number, number];
  const above = points.reduce((sum, [a, b]) => sum + (a - x) * (b - y), 0);
  return above / points.reduce((sum, [a]) => sum + (a - x) ** 2, 0);
}
