import { newKey, putNode } from "@/lib/core/tree/edits/put-node";
import type { ListName } from "@/lib/core/tree/flaw";
import type { Cause, Check, FaultTree, Remedy, Symptom } from "@/lib/core/tree/schema";

/** What can be added by its name alone; the rest is filled in at the side, and soundness says what is missing. */
export type Addable = Extract<ListName, "symptoms" | "checks" | "causes" | "remedies">;

const sources = ["judgement"];

/** A new node with a name, in the tree: as little as makes a node, hung on the symptom that is drawn where that makes sense. */
export function withNew(tree: FaultTree, list: Addable, title: string, symptom: string): { tree: FaultTree; key: string } {
  const key = newKey(tree, title);
  const system = tree.symptoms.find((one) => one.key === symptom)?.system ?? tree.systems[0]?.key ?? "";
  const step = {
    key,
    title,
    system,
    minutes: 5,
    access: "easy" as const,
    mess: "none" as const,
    harm: "none" as const,
    engine: "stopped" as const,
    who: "skipper-at-sea" as const,
    tools: [],
    flags: {},
    cautions: [],
    after: [],
    sources,
  };
  const made: Record<Addable, () => Symptom | Check | Cause | Remedy> = {
    symptoms: () => ({ key, title, detail: title, system, phrases: [title, title, title, title, title], sources }),
    checks: () => ({
      ...step,
      ask: title.endsWith("?") ? title : `${title}: what do you find?`,
      steps: [title],
      firstFor: {},
      findings: [
        { key: "in-order", title: "In order", usual: true },
        { key: "not-in-order", title: "Not in order" },
      ],
    }),
    causes: () => ({
      key,
      title,
      system,
      is: title,
      base: "occasional",
      onset: "either",
      shows: { [symptom]: "often" },
      gives: {},
      curedBy: {},
      broughtOnBy: {},
      roots: [],
      sources,
    }),
    remedies: () => ({
      ...step,
      steps: [title],
      parts: [],
      proof: "It runs as it should under load for ten minutes.",
      tryOut: { minutes: 10 },
    }),
  };
  return { tree: putNode(tree, list, made[list]()), key };
}
