import { DRAWINGS } from "@/lib/core/tree/drawings";
import type { FaultTree } from "@/lib/core/tree/schema";

/** Something that a field may name, and the heading it stands under in a list. */
export type Choice = { key: string; title: string; under?: string };

type Lists = (tree: FaultTree) => readonly Choice[];

const bySystem = (list: readonly { key: string; title: string; system: string }[], tree: FaultTree): Choice[] => {
  const titles = new Map(tree.systems.map(({ key, title }) => [key, title]));
  return list.map(({ key, title, system }) => ({ key, title, under: titles.get(system) ?? system })).sort((a, b) => order(a, b));
};
const order = (a: Choice, b: Choice): number => (a.under ?? "").localeCompare(b.under ?? "") || a.title.localeCompare(b.title);

const systems: Lists = (tree) => tree.systems;
const symptoms: Lists = (tree) => bySystem(tree.symptoms, tree);
const checks: Lists = (tree) => bySystem(tree.checks, tree);
const causes: Lists = (tree) => bySystem(tree.causes, tree);
const remedies: Lists = (tree) => bySystem(tree.remedies, tree);
const cautions: Lists = (tree) =>
  tree.cautions.map(({ key, signal, says }) => ({ key, title: `${says.slice(0, 90)}${says.length > 90 ? "…" : ""}`, under: signal }));
const features: Lists = (tree) => tree.features;
const drawings: Lists = () => Object.entries(DRAWINGS).map(([key, { title }]) => ({ key, title }));

/** Fields that hold the key of a node, whatever node they stand in. */
const NAMES: Readonly<Record<string, Lists>> = {
  system: systems,
  cautions,
  shows: symptoms,
  firstFor: symptoms,
  restates: symptoms,
  symptoms,
  gives: checks,
  check: checks,
  curedBy: remedies,
  remedy: remedies,
  broughtOnBy: causes,
  causes,
  cause: causes,
  features,
  drawing: drawings,
};

/** What a field may name; null for a field that holds words of its own. */
export function choicesFor(name: string, tree: FaultTree): readonly Choice[] | null {
  return NAMES[name]?.(tree) ?? null;
}

/** The findings of a check. */
export function findingsOf(tree: FaultTree, check: string): readonly Choice[] {
  return tree.checks.find(({ key }) => key === check)?.findings ?? [];
}
