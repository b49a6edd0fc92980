import { parseArgs } from "node:util";
import { prove as proveTree, type CaseProof, type Proof } from "@/lib/core/diagnosis/prove";
import { Who } from "@/lib/core/tree/schema";
import { readCases } from "./read-cases";
import { chosen, readTreeOrSay, Refusal } from "./read-tree";

const options = {
  cases: { type: "string" },
  person: { type: "string", default: "mechanic" },
  bar: { type: "string", multiple: true },
  json: { type: "boolean" },
} as const;

type Figure = { figure: string; value: number; bar?: number; holds?: boolean };

/** Figures where less is better; a bar is a most for them, a least for all others. */
const LESS_IS_BETTER = ["called", "minutes.ratioToBaseRate"];

/** The planner has to be no dearer than trying remedies in the order of base rates. */
const BARS: Readonly<Record<string, number>> = { "minutes.ratioToBaseRate": 1 };

/** Replays known cases through a tree, and ends with 1 where a bar does not hold. */
export async function prove(args: string[]): Promise<number> {
  const { values, positionals } = parseArgs({ args, allowPositionals: true, options });
  const tree = await readTreeOrSay(positionals[0]);
  const cases = values.cases === undefined ? tree.knownCases : await readCases(values.cases, tree);
  if (cases.length === 0) throw new Refusal("The tree holds no known cases: name a file with --cases FILE.");
  const proof = proveTree(tree, cases, chosen(Who.options, values.person, "person"));
  const figures = figuresOf(proof, barsOf(values.bar ?? []));
  if (values.json) for (const figure of figures) console.log(JSON.stringify(figure));
  else console.log([...proof.cases.map(caseLine), "", ...figures.map(figureLine)].join("\n"));
  return figures.some(({ holds }) => holds === false) ? 1 : 0;
}

function figuresOf(proof: Proof, bars: Readonly<Record<string, number>>): Figure[] {
  const { start, "but-confirming": butConfirming, all } = proof.right;
  const values: Record<string, number> = { cases: proof.cases.length };
  for (const [told, share] of Object.entries({ start, butConfirming, all })) {
    values[`top1.${told}`] = share.first;
    values[`top3.${told}`] = share.inFirstThree;
  }
  const { cases, inFirstThree, likeliestPair } = proof.twoCauses;
  Object.assign(values, { twoCauses: cases, "twoCauses.bothInFirstThree": inFirstThree, "twoCauses.likeliestPair": likeliestPair });
  Object.assign(values, proof.ends, {
    "minutes.mean": proof.meanMinutes,
    "minutes.baseRate": proof.meanBaseRateMinutes,
    "minutes.ratioToBaseRate": proof.ratio,
  });
  const unknown = Object.keys(bars).find((name) => values[name] === undefined);
  if (unknown !== undefined) throw new Refusal(`There is no figure "${unknown}": choose one of ${Object.keys(values).join(", ")}.`);
  return Object.entries(values).map(([figure, value]) => {
    const bar = bars[figure];
    if (bar === undefined) return { figure, value };
    return { figure, value, bar, holds: LESS_IS_BETTER.includes(figure) ? value <= bar : value >= bar };
  });
}

/** "--bar top3.butConfirming=0.8" over the bars that always stand. */
function barsOf(told: readonly string[]): Record<string, number> {
  const bars = told.map((text): [string, number] => {
    const [name = "", value = ""] = text.split("=");
    if (value.trim() === "" || !Number.isFinite(Number(value)))
      throw new Refusal(`--bar is "${text}"; it reads like top3.butConfirming=0.8.`);
    return [name, Number(value)];
  });
  return { ...BARS, ...Object.fromEntries(bars) };
}

function caseLine({ key, title, place, believed, played, baseRateMinutes }: CaseProof): string {
  const placed = place["but-confirming"] === null ? "not in the tree for this engine" : `number ${place["but-confirming"]}`;
  const path = played.steps.map((step) => (step.kind === "check" ? step.key : `[${step.key}]`)).join(", ");
  return `${key} ${title}: right cause ${placed}${place["but-confirming"] === 1 ? "" : `, believed ${believed ?? "nothing"}`}; ${played.end} in ${Math.round(played.minutes)} min (base-rate order ${Math.round(baseRateMinutes)})\n    ${path}`;
}

function figureLine({ figure, value, bar, holds }: Figure): string {
  const text = `${figure}: ${Number(value.toFixed(3))}`;
  return bar === undefined ? text : `${text} (bar ${bar}: ${holds ? "holds" : "missed"})`;
}
