/** The kinds of node a fault tree has, as people name them. */
export type NodeKind =
  "tree" | "system" | "feature" | "source" | "caution" | "symptom" | "check" | "cause" | "remedy" | "stop rule" | "known case";

/**
 * Something wrong with a tree, in words for the mechanic who wrote it. An
 * "error" keeps a tree from being used; a "look-at" is allowed and probably
 * not meant.
 */
export type Flaw = {
  severity: "error" | "look-at";
  /** Stable name of the rule that found it. */
  rule: string;
  node: { kind: NodeKind; key: string };
  says: string;
  /** What to do about it. */
  mend?: string;
  /** Where in the document, for faults of shape. */
  path?: readonly (string | number)[];
};

/** The document's lists and the kind of node each holds. */
export const LIST_KINDS = {
  systems: "system",
  features: "feature",
  sources: "source",
  cautions: "caution",
  symptoms: "symptom",
  checks: "check",
  causes: "cause",
  remedies: "remedy",
  stopRules: "stop rule",
  knownCases: "known case",
} as const satisfies Record<string, NodeKind>;

export type ListName = keyof typeof LIST_KINDS;

export const isListName = (name: string): name is ListName => Object.hasOwn(LIST_KINDS, name);
