import { beforeAll, describe, expect, test } from "vitest";
import type { DiagnosisEvent } from "@/lib/core/contract/event";
import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { view } from "@/lib/core/diagnosis/show";
import { safetyOf } from "@/lib/core/tree/safety-steps";
import type { FaultTree } from "@/lib/core/tree/schema";
import { Device } from "../core/diagnosis/logs";
import { shippedTree } from "../support/shipped-tree";

let tree: FaultTree;
const models = keepModels();
beforeAll(async () => {
  tree = await shippedTree();
}, 30_000);

/** A skipper at anchor whose engine starts badly, every question about danger answered with no but for those given. */
function atAnchor(yes: readonly string[], then: (phone: Device) => readonly DiagnosisEvent[] = () => []) {
  const phone = new Device(1);
  const begun = phone.begin({ symptoms: ["hard-start-cold"], situation: "at-anchor", person: "skipper-at-sea" });
  const asked = view(tree, [begun], models).rulesToAsk.map(({ key }) => key);
  const answers = asked.map((rule) => phone.tell("rule-answered", { rule, answer: yes.includes(rule) ? "yes" : "no" }));
  return view(tree, [begun, ...answers, ...then(phone)], models);
}

describe("while people may not be below", () => {
  test.each([
    ["fire", () => atAnchor(["fire"])],
    ["petrol-in-fuel", () => atAnchor([], (phone) => [phone.answer("fuel-jar", "petrol-or-solvent")])],
    ["co", () => atAnchor([], (phone) => [phone.answer("exhaust-note", "chuffing")])],
    ["sea-room", () => atAnchor(["sea-room"])],
  ])("%s: nothing is asked for but a call", (rule, shown) => {
    const { rulesInForce, step } = shown();
    expect(rulesInForce.map(({ key }) => key)).toContain(rule);
    expect(step?.kind).toBe("call");
  });

  test("a swollen battery: nothing is cranked, charged, jumped or worked on", () => {
    const { rulesInForce, step } = atAnchor([], (phone) => [phone.answer("battery-look", "swollen")]);
    expect(rulesInForce.map(({ key }) => key)).toEqual(["battery-swelling"]);
    expect(step?.engine).toBe("any");
  });
});

describe("around the sea-water seacock", () => {
  test("every step that opens the water shuts the seacock first, and says that it stays shut where no start is allowed", () => {
    const opens = [...tree.checks, ...tree.remedies].filter(({ flags }) => flags.opensRawWater || flags.opensHoseBelowWater);
    expect(opens.length).toBeGreaterThan(5);
    for (const step of opens) {
      const { first, last } = safetyOf(step, { features: {} });
      expect(
        first.some((text) => /Shut the .*seacock/.test(text)),
        step.key,
      ).toBe(true);
      expect(
        last.some((text) => /^Open the seacock.*before the next start, not sooner.*may not be started keeps it shut/.test(text)),
        step.key,
      ).toBe(true);
    }
  });
});

describe("around the starter", () => {
  test("every step that cranks says how to stop a starter that runs on, and what a heavy clunk means", () => {
    const cranks = [...tree.checks, ...tree.remedies].filter(({ flags }) => flags.cranks !== undefined);
    expect(cranks.length).toBeGreaterThan(15);
    for (const step of cranks)
      expect(safetyOf(step, { features: {} }).cautions.map(({ key }) => key)).toEqual(
        expect.arrayContaining(["starter-runs-on", "hydraulic-lock", "cranking-floods"]),
      );
  });
});
