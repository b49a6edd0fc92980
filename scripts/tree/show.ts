import { parseArgs } from "node:util";
import { questionOrder, type Begin, type LikelyCause, type OrderedStep } from "@/lib/core/diagnosis/question-order";
import { Situation, Who, type FaultTree } from "@/lib/core/tree/schema";
import { didYouMean } from "@/lib/core/tree/nearest";
import { chosen, readTreeOrSay, Refusal } from "./read-tree";

const options = {
  symptom: { type: "string", multiple: true },
  feature: { type: "string", multiple: true },
  situation: { type: "string", default: "alongside" },
  person: { type: "string", default: "skipper-in-port" },
  depth: { type: "string", default: "4" },
  chance: { type: "string", default: "0.15" },
  steps: { type: "string", default: "200" },
} as const;

/** Prints the order of questions for a complaint as an indented tree. */
export async function show(args: string[]): Promise<number> {
  const { values, positionals } = parseArgs({ args, allowPositionals: true, options });
  const tree = await readTreeOrSay(positionals[0]);
  const begin: Begin = {
    symptoms: (values.symptom ?? []).map((key) => known(tree.symptoms, key, "symptom")),
    situation: chosen(Situation.options, values.situation, "situation"),
    person: chosen(Who.options, values.person, "person"),
    profile: { features: featuresOf(tree, values.feature ?? []), figures: {}, healthy: {} },
  };
  if (begin.symptoms.length === 0)
    throw new Refusal(`Say which complaint: --symptom KEY, one of ${tree.symptoms.map(({ key }) => key).join(", ")}.`);
  const { rules, first, possible } = questionOrder(tree, begin, {
    depth: inRange(values.depth, "depth", 1, 8),
    chance: inRange(values.chance, "chance", 0.01, 1),
    steps: inRange(values.steps, "steps", 1, 2000),
  });

  console.log(begin.symptoms.map((key) => tree.symptoms.find((symptom) => symptom.key === key)?.title).join("; "));
  console.log(`Possible at first: ${likeliest(possible)}.`);
  for (const rule of rules) console.log(`Asked before all: ${rule} No.`);
  console.log(linesOf(first, "").join("\n"));
  return 0;
}

const of100 = (share: number): string => (share < 0.01 ? "under 1 of 100" : `${Math.round(share * 100)} of 100`);
const likeliest = (possible: readonly LikelyCause[]): string => possible.map(({ title, share }) => `${title} ${of100(share)}`).join("; ");

function linesOf(step: OrderedStep, indent: string): string[] {
  const lead = { check: "", remedy: "Try: ", call: "" }[step.kind];
  const inner = `${indent}    `;
  const branches = step.branches.flatMap(({ says, chance, then, possible }) => [
    `${inner}${says} (${of100(chance)})${then ? ":" : possible.length > 0 ? ` -> ${likeliest(possible)}` : ""}`,
    ...(then === null ? [] : linesOf(then, `${inner}    `)),
  ]);
  const rare =
    step.rare.length === 0 ? [] : [`${inner}rarer: ${step.rare.map(({ says, chance }) => `${says} (${of100(chance)})`).join("; ")}`];
  return [`${indent}${lead}${step.title} (${Math.max(1, Math.round(step.minutes))} min)`, ...branches, ...rare];
}

function known(nodes: readonly { key: string }[], key: string, what: string): string {
  if (nodes.some((node) => node.key === key)) return key;
  const keys = nodes.map((node) => node.key);
  throw new Refusal(`The tree has no ${what} "${key}". ${didYouMean(key, keys, `It has ${keys.join(", ")}.`)}`);
}

function inRange(text: string, what: string, least: number, most: number): number {
  const value = Number(text);
  if (!(value >= least && value <= most)) throw new Refusal(`--${what} is "${text}"; it has to be from ${least} to ${most}.`);
  return value;
}

function featuresOf(tree: FaultTree, told: readonly string[]): Record<string, string> {
  return Object.fromEntries(
    told.map((text) => {
      const [key = "", option = ""] = text.split("=");
      known(tree.features, key, "feature");
      return [key, known(tree.features.find((feature) => feature.key === key)?.options ?? [], option, `option of ${key}`)];
    }),
  );
}
