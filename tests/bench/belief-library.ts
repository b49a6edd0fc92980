import { createRequire } from "node:module";
import type { INetwork } from "bayesjs";
import { believe } from "@/lib/core/diagnosis/believe";
import type { Evidence } from "@/lib/core/diagnosis/evidence";
import type { CheckModel, Model } from "@/lib/core/diagnosis/model";
import { heard } from "@/lib/core/diagnosis/finding-weight";
import { pairShare } from "@/lib/core/diagnosis/pair-finding";
import { compile } from "@/lib/core/diagnosis/compile";
import type { FaultTree } from "@/lib/core/tree/schema";
import { pairAt } from "@/lib/core/diagnosis/pairs";

// The library is CommonJS whose exports Node cannot name.
const { addNode, infer } = createRequire(import.meta.url)("bayesjs") as typeof import("bayesjs");

export type LibraryTime = {
  /** States of the node that holds the fault. */
  readonly states: number;
  readonly findings: number;
  /** One belief of the library: the share of the likeliest hypothesis. */
  readonly libraryMs: number;
  /** One belief of ours: the shares of all of them. */
  readonly oursMs: number;
  readonly difference: number;
};

/** The best of so many: what else the machine does in between is not ours. The library takes seconds, and gets one. */
const TURNS = { ours: 5, library: 1 };

/**
 * The same network, and the same findings, put to a general-purpose
 * Bayesian-network library: one node for the fault, one for each check that was
 * asked. The library is given what it can hold: only what was asked, and one
 * state to work out. Symptoms and remedies are left out.
 *
 * @param pairs whether pairs of causes are states too; some hundreds of states are what the library bears.
 */
export function timeLibrary(model: Model, findings: Evidence["findings"], pairs: boolean): LibraryTime {
  const told = heard(model, findings);
  const states = statesOf(model, pairs);
  let network: INetwork = addNode(
    {},
    {
      id: "fault",
      states: states.map(({ name }) => name),
      parents: [],
      cpt: Object.fromEntries(states.map(({ name, prior }) => [name, prior])),
    },
  );
  for (const { check } of told)
    network = addNode(network, {
      id: check.key,
      states: check.check.findings.map(({ key }) => key),
      parents: ["fault"],
      cpt: states.map(({ name, share }) => ({
        when: { fault: name },
        then: Object.fromEntries(check.check.findings.map(({ key }, finding) => [key, share(check, finding)])),
      })),
    });
  const given = Object.fromEntries(told.map(({ check, finding }) => [check.key, check.check.findings[finding]!.key]));
  const evidence: Evidence = { symptoms: [], findings, remedies: [] };
  const { alone } = believe(model, evidence);
  const best = alone.indexOf(alone.reduce((a, b) => Math.max(a, b)));
  let theirs = NaN;
  // The library keeps what it worked out for a network: it gets a new one, as a new answer brings.
  const libraryMs = bestMs(TURNS.library, () => (theirs = infer({ ...network }, { fault: states[best]!.name }, given)));
  const oursMs = bestMs(TURNS.ours, () => believe(model, evidence));
  return { states: states.length, findings: told.length, libraryMs, oursMs, difference: Math.abs(theirs - alone[best]!) };
}

/** As many causes as the library bears with all their pairs. */
const CAUSES_WITH_PAIRS = 12;
const FINDINGS = 3;

/** The library's time on the shipped tree's network beside ours, with the same answers: all causes, and the pairs of a few. */
export function libraryFigures(tree: FaultTree): { figure: string; value: number; on: string }[] {
  const timed = (faults: "one" | "two"): { figure: string; value: number; on: string }[] => {
    const causes = faults === "one" ? tree.causes : tree.causes.slice(0, CAUSES_WITH_PAIRS);
    const model = compile(
      { ...tree, causes },
      { profile: { features: {}, figures: {}, healthy: {} }, situation: "alongside", person: "mechanic", faults },
    );
    const asked = model.checks.filter(({ linked }) => linked).slice(0, FINDINGS);
    const findings = asked.map(({ key, check }, index) => ({ check: key, finding: check.findings[index % check.findings.length]!.key }));
    const time = timeLibrary(model, findings, faults === "two");
    const name = faults === "one" ? "belief.library" : "belief.libraryPairs";
    const on = `${time.states} states, ${time.findings} findings; the two differ by ${time.difference.toExponential(0)}`;
    return [
      { figure: `${name}.ms`, value: time.libraryMs, on },
      { figure: `${name}.oursMs`, value: time.oursMs, on: "the same network, every share" },
    ];
  };
  return [...timed("one"), ...timed("two")];
}

type State = { readonly name: string; readonly prior: number; readonly share: (check: CheckModel, finding: number) => number };

function statesOf(model: Model, pairs: boolean): readonly State[] {
  const singles = [...model.logPrior].map((log, index): State => ({
    name: `only-${index}`,
    prior: Math.exp(log),
    share: (check, finding) => check.rows[finding]![index]!,
  }));
  if (!pairs || !model.pairs) return singles;
  const count = model.causes.length;
  const { each, at, more } = model.pairs.prior;
  const extra = new Map([...at].map((place, index) => [place, more[index]!]));
  const both = model.causes.flatMap((_, a) =>
    model.causes.slice(a + 1).map((__, offset): State => {
      const b = a + 1 + offset;
      return {
        name: `both-${a}-${b}`,
        prior: Math.exp(each[a]! + each[b]! + (extra.get(pairAt(a, b, count)) ?? 0)),
        share: (check, finding) => pairShare(check, finding, a, b),
      };
    }),
  );
  return [...singles, ...both];
}

function bestMs(turns: number, work: () => void): number {
  let best = Infinity;
  for (let turn = 0; turn < turns; turn++) {
    const start = performance.now();
    work();
    best = Math.min(best, performance.now() - start);
  }
  return best;
}
