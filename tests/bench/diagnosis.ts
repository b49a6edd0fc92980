import { parseArgs } from "node:util";
import { OTHERS, scenarioFigures, sizeFigures } from "./diagnosis/cost-figures";
import type { ExactTask } from "./diagnosis/exact-regrets";
import { atMost, print, type Figure } from "./diagnosis/figures";
import type { MadeTask } from "./diagnosis/made-runs";
import { addRuns, mean, noRuns, ratioOf, type Runs } from "./diagnosis/runs";
import type { ShippedTask } from "./diagnosis/shipped-runs";
import { timeFigures } from "./diagnosis/times";
import { twoFaultFigures } from "./diagnosis/two-fault-figures";
import type { TwoFaultRun, TwoFaultTask } from "./diagnosis/two-fault-runs";
import { heapFigure } from "./diagnosis/heap";
import { inStep, workThrough } from "./diagnosis/work-through";

/**
 * What the planner's next steps cost beside other ways of going on, beside the
 * exact optimum on small models, and how long it thinks.
 *
 *   npm run bench -- diagnosis [--quick] [--json] [--seed N]
 */
const { values } = parseArgs({
  options: { quick: { type: "boolean" }, json: { type: "boolean" }, seed: { type: "string", default: "1" } },
});
const quick = values.quick === true;
const seed = Number(values.seed);
if (!Number.isInteger(seed)) {
  console.error(`--seed is "${values.seed}"; it has to be a whole number.`);
  process.exit(2);
}
const MINUTES = quick ? 0.4 : 8;
/** Runs wanted, and as many as are handed out at once; fewer where the time is up. */
const SIZES = [
  { size: 10, runs: 4000, at: 100 },
  { size: 30, runs: 4000, at: 80 },
  { size: 110, runs: 2000, at: 40 },
  { size: 200, runs: 1000, at: 20 },
  { size: 300, runs: 600, at: 12 },
  { size: 1000, runs: 200, at: 4 },
] as const;
const SHARE = quick ? 0.05 : 1;
const SPOILT = [
  { name: "oneInTenWrong", wrong: 0.1, refused: 0 },
  { name: "oneInFiveRefused", wrong: 0, refused: 0.2 },
] as const;

type Named<T> = T & { readonly name: string };
const chunks = <T extends object>(count: number, at: number, task: T): (T & { from: number; to: number })[] =>
  Array.from({ length: Math.ceil(count / at) }, (_, place) => ({ ...task, from: place * at, to: Math.min(count, (place + 1) * at) }));
const wanted = (count: number): number => Math.max(8, Math.round(count * SHARE));

const made = (size: number, name: string, wrong = 0, refused = 0) => ({ kind: "made" as const, name, size, seed, wrong, refused });
const shipped = (name: string, bareCall: boolean, wrong = 0, refused = 0) => ({
  kind: "shipped" as const,
  name,
  seed,
  wrong,
  refused,
  bareCall,
});
const lists: Named<MadeTask | ShippedTask | ExactTask | TwoFaultTask>[][] = [
  ...SIZES.map(({ size, runs, at }) => chunks(wanted(runs), quick ? Math.ceil(at / 5) : at, made(size, String(size)))),
  chunks(wanted(1000), 20, { kind: "exact" as const, name: "exact", seed }),
  chunks(wanted(360), 12, shipped("shipped", false)),
  chunks(wanted(180), 12, shipped("shipped.bareCall", true)),
  ...SPOILT.flatMap(({ name, wrong, refused }) => [
    chunks(wanted(400), 20, made(110, `110.${name}`, wrong, refused)),
    chunks(wanted(180), 12, shipped(`shipped.${name}`, false, wrong, refused)),
  ]),
  chunks(wanted(240), 12, { kind: "two-faults" as const, name: "two-faults", seed }),
];

const runsOf = new Map<string, Runs>();
const regrets: number[] = [];
const twoFaults: TwoFaultRun[] = [];
await workThrough(inStep(lists), performance.now() + MINUTES * 60_000, ({ name }, done) => {
  if ("regrets" in done) regrets.push(...done.regrets);
  else if ("twoFaults" in done) twoFaults.push(...done.twoFaults);
  else {
    const runs = runsOf.get(name) ?? noRuns();
    addRuns(runs, done.runs);
    runsOf.set(name, runs);
  }
});

regrets.sort((a, b) => a - b);
const sizes = SIZES.map(({ size }) => ({ size, runs: runsOf.get(String(size)) ?? noRuns() }));
const figures: Figure[] = [
  atMost("regret.mean", mean(regrets), 0.01, `${regrets.length} models of 7 causes, 5 checks, 7 remedies`),
  atMost("regret.p99", regrets[Math.floor(0.99 * regrets.length)] ?? NaN, 0.05),
  atMost("regret.worst", regrets.at(-1) ?? NaN),
  ...sizes.flatMap(({ size, runs }) => sizeFigures(size, runs)),
  atMost(
    "cost.ratioToInformation.mean",
    mean(sizes.filter(({ runs }) => runs.group.length > 0).map(({ runs }) => ratioOf(runs, "planner", "informationPerCost").ratio)),
    0.95,
  ),
  ...[...runsOf]
    .filter(([name]) => !/^\d+$/.test(name))
    .flatMap(([name, runs]) => scenarioFigures(name, runs, name === "shipped" ? 1.03 : null)),
  ...twoFaultFigures(twoFaults),
  ...(await timeFigures(seed, quick ? 2 : 25)),
  heapFigure(seed),
];
if (!values.json) console.log(`Mean minutes; the other ways are ${OTHERS.join(", ")}. Seed ${seed}.`);
print(figures, values.json === true);
process.exitCode = figures.some(({ holds }) => holds === false) ? 1 : 0;
