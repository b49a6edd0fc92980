import type { Flaw } from "../flaw";
import type { Cause, Check, FaultTree, Remedy, StopRule } from "../schema";

/** What a rule says of one node; its name and severity stand in the rule itself. */
export type Found = Pick<Flaw, "node" | "says" | "mend">;

/** What several rules look up, done once a run. */
export type Once = <T>(work: (tree: FaultTree) => T) => T;

/** One thing that a sound tree keeps to. */
export type Rule = {
  /** Stable: tests, screens and people refer to it. */
  name: string;
  severity: Flaw["severity"];
  find: (tree: FaultTree, once: Once) => Found[];
};

export type StepNode = { kind: "check"; step: Check } | { kind: "remedy"; step: Remedy };

/** Checks and remedies together: all that hands do. */
export const stepsOf = (tree: FaultTree): StepNode[] => [
  ...tree.checks.map((step) => ({ kind: "check" as const, step })),
  ...tree.remedies.map((step) => ({ kind: "remedy" as const, step })),
];

export const checkNode = ({ key }: Pick<Check, "key">): Flaw["node"] => ({ kind: "check", key });
export const causeNode = ({ key }: Pick<Cause, "key">): Flaw["node"] => ({ kind: "cause", key });
export const stepNode = ({ kind, step }: StepNode): Flaw["node"] => ({ kind, key: step.key });
export const ruleNode = ({ key }: Pick<StopRule, "key">): Flaw["node"] => ({ kind: "stop rule", key });
export const symptomNode = (key: string): Flaw["node"] => ({ kind: "symptom", key });

/** Keys that stand more than once, each named once. */
export function twice(keys: readonly string[]): string[] {
  const seen = new Set<string>();
  return [...new Set(keys.filter((key) => seen.has(key) || !seen.add(key)))];
}

/** A loop in a graph, as the keys along it with the first again at the end; null where there is none. */
export function findLoop(next: ReadonlyMap<string, readonly string[]>): string[] | null {
  const done = new Set<string>();
  const walk = (key: string, path: readonly string[]): string[] | null => {
    const at = path.indexOf(key);
    if (at >= 0) return [...path.slice(at), key];
    if (done.has(key)) return null;
    for (const to of next.get(key) ?? []) {
      const loop = walk(to, [...path, key]);
      if (loop !== null) return loop;
    }
    done.add(key);
    return null;
  };
  for (const key of next.keys()) {
    const loop = walk(key, []);
    if (loop !== null) return loop;
  }
  return null;
}
