import { beforeAll, describe, expect, test, vi } from "vitest";
import { CORE_VERSION } from "@/lib/core/diagnosis/core-version";
import { evidenceOf } from "@/lib/core/diagnosis/evidence-of";
import { fold } from "@/lib/core/diagnosis/fold";
import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { logOf, type Payload } from "@/lib/core/diagnosis/log-of";
import { nextStep, type NextStep } from "@/lib/core/diagnosis/next-step";
import { settingOf } from "@/lib/core/diagnosis/setting-of";
import { rulesToAsk } from "@/lib/core/diagnosis/stop-rules";
import { engineKinds } from "@/lib/core/tree/engine-kinds";
import type { FaultTree, Situation, Who } from "@/lib/core/tree/schema";
import { shippedTree } from "../support/shipped-tree";

// The whole tree is compiled once a setting: seconds, on a busy machine.
vi.setConfig({ testTimeout: 60_000, hookTimeout: 30_000 });

let tree: FaultTree;
beforeAll(async () => {
  tree = await shippedTree();
});

type Hands = { person: Who; situation: Situation };

const HANDS: readonly Hands[] = [
  { person: "skipper-at-sea", situation: "under-way" },
  { person: "skipper-at-sea", situation: "at-anchor" },
  { person: "skipper-in-port", situation: "alongside" },
  { person: "mechanic", situation: "alongside" },
];

/** Every first question of the planner: what was touched last, and then the first about the complaint itself. */
function* firstSteps(features: Readonly<Record<string, string>>, hands: Hands): Generator<{ symptom: string; step: NextStep }> {
  const models = keepModels();
  for (const { key: symptom } of tree.symptoms) {
    const begun: Payload = {
      kind: "begun",
      payload: {
        ...hands,
        symptoms: [symptom],
        profile: { features, figures: {}, healthy: {} },
        engineId: "engine",
        treeVersionId: "tree",
        multipliers: [],
        coreVersion: CORE_VERSION,
      },
    };
    const log: Payload[] = [begun];
    for (const { key } of rulesToAsk(tree, fold(logOf(log)))) log.push({ kind: "rule-answered", payload: { rule: key, answer: "no" } });
    for (;;) {
      const state = fold(logOf(log));
      const step = nextStep(models(tree, settingOf(tree, state)), evidenceOf(tree, state));
      yield { symptom, step };
      if (step.because !== "what-changed") break;
      const usual = tree.checks.find(({ key }) => key === step.key)!.findings.find((finding) => finding.usual)!;
      log.push({ kind: "answered", payload: { check: step.key, answer: { finding: usual.key }, photos: [] } });
    }
  }
}

/** Anyone can answer it at once: a check, and nothing to fetch for it. */
const withNothingInHand = ({ kind, key }: NextStep): boolean =>
  kind === "check" && tree.checks.find((check) => check.key === key)?.tools.length === 0;

describe("the first questions about any symptom need no tool", () => {
  const engines: [string, () => Readonly<Record<string, string>>][] = [
    ["of which nothing is known", () => ({})],
    ["of the commonest kind", () => engineKinds(tree.features)[0]!.features],
  ];
  test.each(engines.flatMap(([engine, features]) => HANDS.map((hands) => ({ engine, features, hands }))))(
    "on an engine $engine, $hands.person, $hands.situation",
    ({ features, hands }) => {
      const steps = [...firstSteps(features(), hands)];
      expect(steps.length).toBeGreaterThanOrEqual(tree.symptoms.length);
      const bad = steps.filter(({ step }) => !withNothingInHand(step));
      expect(bad.map(({ symptom, step }) => `${symptom}: ${step.kind} ${step.key}`)).toEqual([]);
    },
  );

  test("on every common kind of engine, under way", () => {
    const bad = engineKinds(tree.features).flatMap(({ features, differsBy }) =>
      [...firstSteps(features, HANDS[0]!)]
        .filter(({ step }) => !withNothingInHand(step))
        .map(
          ({ symptom, step }) => `${differsBy?.feature ?? "commonest"} ${differsBy?.option ?? ""}: ${symptom}: ${step.kind} ${step.key}`,
        ),
    );
    expect(bad).toEqual([]);
  });
});
