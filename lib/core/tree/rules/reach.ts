import type { NodeKind } from "../flaw";
import { referencesOf } from "../references";
import type { FaultTree } from "../schema";
import { causeNode, checkNode, symptomNode, type Found, type Once, type Rule } from "./rule";

/** Does any node of these kinds name it, in one of these fields? */
function namedIn(tree: FaultTree): (to: NodeKind, key: string, ...fields: string[]) => boolean {
  const all = new Set(referencesOf(tree).map(({ to, key, field }) => `${to} ${key} ${field}`));
  return (to, key, ...fields) => fields.some((field) => all.has(`${to} ${key} ${field}`));
}

function symptomsNoCauseShows(tree: FaultTree, once: Once): Found[] {
  const named = once(namedIn);
  return tree.symptoms
    .filter(({ key }) => !named("symptom", key, "shows"))
    .map(({ key }) => ({
      node: symptomNode(key),
      says: "no cause shows it, so a diagnosis that begins with it has nothing to ask.",
      mend: 'Name it under "shows" of the causes that show it, or take it out.',
    }));
}

function checksNothingHangsOn(tree: FaultTree, once: Once): Found[] {
  const named = once(namedIn);
  return tree.checks
    .filter(({ key, asksWhatChanged }) => !named("check", key, "gives", "after", "when > findings", "clearedBy") && !asksWhatChanged)
    .map((check) => ({
      node: checkNode(check),
      says: "no cause, stop rule or later step hangs on it, so it is never asked.",
      mend: 'Name it under "gives" of the causes it tells apart, or take it out.',
    }));
}

function remediesNoCauseNeeds(tree: FaultTree, once: Once): Found[] {
  const named = once(namedIn);
  return tree.remedies
    .filter(({ key }) => !named("remedy", key, "curedBy", "after"))
    .map(({ key }) => ({
      node: { kind: "remedy" as const, key },
      says: "no cause is cured by it, so it is never offered.",
      mend: 'Name it under "curedBy" of the causes it cures, or take it out.',
    }));
}

function cautionsNobodyCites(tree: FaultTree, once: Once): Found[] {
  const named = once(namedIn);
  return tree.cautions
    .filter(({ key }) => !named("caution", key, "cautions"))
    .map(({ key }) => ({
      node: { kind: "caution" as const, key },
      says: "no check or remedy cites it, so nobody reads it.",
      mend: 'Name it under "cautions" of the steps it belongs to, or take it out.',
    }));
}

function causesThatShowNothing(tree: FaultTree, once: Once): Found[] {
  const named = once(namedIn);
  return tree.causes
    .filter(({ key, shows }) => Object.keys(shows).length === 0 && !named("cause", key, "broughtOnBy"))
    .map((cause) => ({
      node: causeNode(cause),
      says: "it shows no symptom and brings nothing on, so it is never found.",
      mend: 'Add the symptoms it causes under "shows".',
    }));
}

/** Features that the safety steps ask for, whether or not a node of the tree does. */
const ASKED_FOR_SAFETY = ["injection", "exhaust"];

function partsNobodyUses(tree: FaultTree): Found[] {
  const used = new Set(referencesOf(tree).map(({ to, key }) => `${to} ${key}`));
  const unused = (kind: "system" | "feature" | "source", nodes: readonly { key: string }[]) =>
    nodes
      .filter(({ key }) => !used.has(`${kind} ${key}`))
      .map(({ key }) => ({
        node: { kind, key },
        says: "nothing in the tree uses it.",
        mend: "Take it out, unless something is still to come.",
      }));
  return [
    ...unused("system", tree.systems),
    ...unused(
      "feature",
      tree.features.filter(({ key }) => !ASKED_FOR_SAFETY.includes(key)),
    ),
    ...unused("source", tree.sources),
  ];
}

export const reachRules: readonly Rule[] = [
  { name: "symptom-no-cause-shows", severity: "error", find: symptomsNoCauseShows },
  { name: "check-nothing-hangs-on", severity: "error", find: checksNothingHangsOn },
  { name: "remedy-no-cause-needs", severity: "error", find: remediesNoCauseNeeds },
  { name: "caution-nobody-cites", severity: "error", find: cautionsNobodyCites },
  { name: "cause-shows-nothing", severity: "error", find: causesThatShowNothing },
  { name: "unused", severity: "look-at", find: partsNobodyUses },
];
