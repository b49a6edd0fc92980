import type { Flaw, NodeKind } from "./flaw";
import type { AppliesTo, FaultTree } from "./schema";

/** A key that one node writes to name another. */
export type Reference = {
  from: Flaw["node"];
  /** What the key has to be: a node, or a part of one (then `of` is its owner). */
  to: NodeKind | "finding" | "option";
  of?: string;
  key: string;
  /** The field it stands in, for messages. */
  field: string;
};

type Out = Omit<Reference, "from">;

/** Every key by which a node of the tree names another. */
export function referencesOf(tree: FaultTree): Reference[] {
  const from = (kind: NodeKind, key: string, out: Out[]): Reference[] => out.map((reference) => ({ from: { kind, key }, ...reference }));
  return [
    ...tree.features.flatMap((feature) => from("feature", feature.key, sources(feature.sources ?? []))),
    ...tree.cautions.flatMap((caution) => from("caution", caution.key, sources(caution.sources))),
    ...tree.symptoms.flatMap((symptom) => from("symptom", symptom.key, [system(symptom.system), ...sources(symptom.sources)])),
    ...tree.checks.flatMap((check) => from("check", check.key, [...stepRefs(check), ...checkRefs(check)])),
    ...tree.remedies.flatMap((remedy) => from("remedy", remedy.key, [...stepRefs(remedy), ...upkeepRefs(remedy)])),
    ...tree.causes.flatMap((cause) => from("cause", cause.key, causeRefs(cause))),
    ...tree.stopRules.flatMap((rule) => from("stop rule", rule.key, stopRuleRefs(rule))),
    ...tree.knownCases.flatMap((known) => from("known case", known.key, knownCaseRefs(known))),
    ...(tree.inseparable ?? []).flatMap(({ causes }) =>
      from(
        "tree",
        tree.key,
        causes.map((key): Out => ({ to: "cause", key, field: "inseparable" })),
      ),
    ),
  ];
}

const system = (key: string): Out => ({ to: "system", key, field: "system" });

/** A citation begins with its source's key. */
const sources = (citations: readonly string[]): Out[] =>
  citations.map((citation) => ({ to: "source", key: citation.split(" ")[0] ?? citation, field: "sources" }));

const finding = (check: string, key: string, field: string): Out[] => [
  { to: "check", key: check, field },
  { to: "finding", of: check, key, field },
];

function applies(appliesTo: AppliesTo | undefined, field = "appliesTo"): Out[] {
  return Object.entries(appliesTo?.features ?? {}).flatMap(([feature, options]): Out[] => [
    { to: "feature", key: feature, field },
    ...options.map((key): Out => ({ to: "option", of: feature, key, field })),
  ]);
}

function stepRefs(step: FaultTree["checks"][number] | FaultTree["remedies"][number]): Out[] {
  return [
    system(step.system),
    ...step.cautions.map((key): Out => ({ to: "caution", key, field: "cautions" })),
    ...step.after.flatMap((before): Out[] => {
      if ("remedy" in before) return [{ to: "remedy", key: before.remedy, field: "after" }];
      return before.finding === undefined
        ? [{ to: "check", key: before.check, field: "after" }]
        : finding(before.check, before.finding, "after");
    }),
    ...applies(step.appliesTo),
    ...sources(step.sources),
  ];
}

const upkeepRefs = ({ upkeep }: FaultTree["remedies"][number]): Out[] => [
  ...(upkeep?.guards ?? []).map((key): Out => ({ to: "cause", key, field: "upkeep > guards" })),
  ...sources(upkeep?.sources ?? []),
];

function checkRefs(check: FaultTree["checks"][number]): Out[] {
  return [
    ...check.findings.flatMap(({ restates }): Out[] =>
      restates === undefined ? [] : [{ to: "symptom", key: restates, field: "restates" }],
    ),
    ...Object.keys(check.firstFor).map((key): Out => ({ to: "symptom", key, field: "firstFor" })),
    ...(check.reading?.bands ?? []).flatMap((band): Out[] => [
      { to: "finding", of: check.key, key: band.finding, field: "reading > bands" },
      ...applies(band.when, "reading > bands > when"),
    ]),
  ];
}

function causeRefs(cause: FaultTree["causes"][number]): Out[] {
  return [
    system(cause.system),
    ...Object.keys(cause.shows).map((key): Out => ({ to: "symptom", key, field: "shows" })),
    ...Object.entries(cause.gives).flatMap(([check, links]): Out[] => [
      { to: "check", key: check, field: "gives" },
      ...Object.keys(links).flatMap((spec) => spec.split("..").map((key): Out => ({ to: "finding", of: check, key, field: "gives" }))),
    ]),
    ...Object.keys(cause.curedBy).map((key): Out => ({ to: "remedy", key, field: "curedBy" })),
    ...Object.keys(cause.broughtOnBy).map((key): Out => ({ to: "cause", key, field: "broughtOnBy" })),
    ...applies(cause.appliesTo),
    ...sources(cause.sources),
  ];
}

function stopRuleRefs(rule: FaultTree["stopRules"][number]): Out[] {
  const symptoms = rule.when.symptoms === "*" ? [] : rule.when.symptoms;
  return [
    ...symptoms.map((key): Out => ({ to: "symptom", key, field: "when > symptoms" })),
    ...rule.when.findings.flatMap((ref) => finding(ref.check, ref.finding, "when > findings")),
    ...rule.clearedBy.flatMap((ref) => finding(ref.check, ref.finding, "clearedBy")),
    ...applies(rule.appliesTo),
    ...sources(rule.sources),
  ];
}

function knownCaseRefs(known: FaultTree["knownCases"][number]): Out[] {
  return [
    ...Object.entries(known.features).flatMap(([feature, option]): Out[] => [
      { to: "feature", key: feature, field: "features" },
      { to: "option", of: feature, key: option, field: "features" },
    ]),
    ...known.symptoms.map((key): Out => ({ to: "symptom", key, field: "symptoms" })),
    ...known.findings.flatMap((seen): Out[] =>
      seen.finding === undefined ? [{ to: "check", key: seen.check, field: "findings" }] : finding(seen.check, seen.finding, "findings"),
    ),
    ...(known.tried ?? []).map(({ remedy }): Out => ({ to: "remedy", key: remedy, field: "tried" })),
    ...[...known.causes, ...known.alsoAccept.map(({ cause }) => cause)].map((key): Out => ({ to: "cause", key, field: "causes" })),
  ];
}
