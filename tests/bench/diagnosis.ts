import path from "node:path";
import { believe } from "@/lib/core/diagnosis/believe";
import { compile } from "@/lib/core/diagnosis/compile";
import type { Evidence } from "@/lib/core/diagnosis/evidence";
import type { Model } from "@/lib/core/diagnosis/model";
import { nextStep } from "@/lib/core/diagnosis/next-step";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree } from "@/lib/core/tree/schema";
import { readTreeFolder } from "@/lib/server/trees/read-tree-folder";

/**
 * How long the core takes on the shipped tree: one next step, one belief update.
 * Runs of a diagnosis are simulated from a fixed seed, so that steps are timed
 * at all depths, on what they would really be asked with.
 *
 *   npm run bench -- diagnosis [--json]
 */
const RUNS = 60;
const STEPS = 12;
const REPEATS = 50;

type Figure = { figure: string; value: number; bar: number | null; holds: boolean | null };

/** Mulberry32: small, seeded, good enough to roll findings with. */
function dice(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

function pickFrom(weights: Float64Array, roll: number): number {
  let left = roll * weights.reduce((sum, one) => sum + one, 0);
  return Math.max(
    0,
    weights.findIndex((one) => (left -= one) < 0),
  );
}

/** The best of three: what else the machine does in between is not ours. */
function timed<T>(work: () => T): [T, number] {
  let best = Infinity;
  let result = work();
  for (let turn = 0; turn < 3; turn++) {
    const start = performance.now();
    result = work();
    best = Math.min(best, performance.now() - start);
  }
  return [result, best];
}

/** One run: a cause drawn by its weight, findings drawn from its rows; times of every next step, and the evidence it met. */
function play(model: Model, symptom: string, roll: () => number, times: number[]): Evidence[] {
  const row = model.symptoms.get(symptom);
  const truth = pickFrom(
    model.logPrior.map((log, index) => Math.exp(log) * (row?.[index] ?? 0)),
    roll(),
  );
  let evidence: Evidence = { symptoms: [{ symptom, present: true }], findings: [], remedies: [] };
  const met = [evidence];
  for (let turn = 0; turn < STEPS; turn++) {
    const [step, took] = timed(() => nextStep(model, evidence));
    times.push(took);
    if (step.kind === "call") break;
    if (step.kind === "remedy") evidence = { ...evidence, remedies: [...evidence.remedies, { remedy: step.key, result: "no-change" }] };
    else {
      const check = model.checks[model.checkAt.get(step.key) ?? -1];
      const finding = check
        ? pickFrom(
            Float64Array.from(check.rows, (one) => one[truth] ?? 0),
            roll(),
          )
        : 0;
      evidence = {
        ...evidence,
        findings: [...evidence.findings, { check: step.key, finding: check?.check.findings[finding]?.key ?? null }],
      };
    }
    met.push(evidence);
  }
  return met;
}

const quantile = (times: readonly number[], share: number): number =>
  [...times].sort((a, b) => a - b)[Math.min(times.length - 1, Math.floor(share * times.length))] ?? NaN;

function measure(tree: FaultTree): Figure[] {
  const begun = performance.now();
  const model = compile(tree, { profile: { features: {}, figures: {}, healthy: {} }, situation: "alongside", person: "mechanic" });
  const compiled = performance.now() - begun;
  const roll = dice(20_250_601);
  const run = (times: number[]): Evidence[] =>
    play(model, tree.symptoms[Math.floor(roll() * tree.symptoms.length)]?.key ?? "", roll, times);
  // The first runs only warm the machine.
  for (let warm = 0; warm < 10; warm++) run([]);
  const times: number[] = [];
  const met = Array.from({ length: RUNS }, () => run(times)).flat();
  const updates: number[] = [];
  for (const evidence of met) {
    const [, took] = timed(() => {
      for (let repeat = 0; repeat < REPEATS; repeat++) believe(model, evidence);
    });
    updates.push((took / REPEATS) * 1000);
  }
  const figure = (name: string, value: number, bar: number | null): Figure => ({
    figure: name,
    value: Number(value.toPrecision(4)),
    bar,
    holds: bar === null ? null : value <= bar,
  });
  return [
    figure("tree.causes", tree.causes.length, null),
    figure("tree.checks", tree.checks.length, null),
    figure("compileMs", compiled, null),
    figure("nextStep.calls", times.length, null),
    figure("nextStep.p50Ms", quantile(times, 0.5), null),
    figure("nextStep.p99Ms", quantile(times, 0.99), 10),
    figure("belief.updateUs", quantile(updates, 0.5), 50),
    figure("belief.updateP99Us", quantile(updates, 0.99), null),
  ];
}

const folder = path.resolve(import.meta.dirname, "../../trees/small-marine-diesel");
const read = await readTreeFolder(folder);
const parsed = "faults" in read ? null : parseTree(read.document);
if (!parsed || !("tree" in parsed)) {
  console.error(`The tree in ${folder} cannot be read: npm run tree -- check trees/small-marine-diesel says why.`);
  process.exit(1);
}
const figures = measure(parsed.tree);
if (process.argv.includes("--json")) for (const one of figures) console.log(JSON.stringify(one));
else
  console.table(
    Object.fromEntries(figures.map(({ figure, value, bar, holds }) => [figure, { value, bar: bar ?? "", holds: holds ?? "" }])),
  );
process.exitCode = figures.some(({ holds }) => holds === false) ? 1 : 0;
