import { beforeAll, expect, test } from "vitest";
import type { Check, FaultTree } from "@/lib/core/tree/schema";
import { shippedTree } from "../support/shipped-tree";
import { FIGURE_EXCEPTIONS } from "./figure-exceptions";

/** A number in digits with what it counts after it. */
const FIGURE =
  /\d[\d., ]*(%|°|Ω|(m?V|m?A|kPa|m?bar|psi|rpm|revs|s|min|h|mm|cm|m|ml|l|Nm|kg|ohms?|volts?|amps?|per cent|degrees?|seconds?|minutes?|hours?|metres?|litres?|drops?|turns?|strokes?)\b)/;

let tree: FaultTree;
beforeAll(async () => {
  tree = await shippedTree();
});

const figuresOf = ({ ask, steps, findings }: Check): string[] =>
  [ask, ...steps, ...findings.map(({ title }) => title)].filter((text) => FIGURE.test(text));

test("the words of the checks hold figures at all", () => {
  const found = tree.checks.filter((check) => figuresOf(check).length > 0).map(({ key }) => key);
  expect(found).toEqual(expect.arrayContaining(["start-time", "oil-use-rate", "compression-pattern"]));
});

test("a check with a figure in its question, steps or findings is a reading, or stands in the list with the reason", () => {
  const bare = tree.checks.filter((check) => check.reading === undefined && FIGURE_EXCEPTIONS[check.key] === undefined);
  expect(bare.flatMap((check) => figuresOf(check).map((text) => `${check.key}: ${text}`))).toEqual([]);
});

test("every exception is still needed", () => {
  const idle = Object.keys(FIGURE_EXCEPTIONS).filter((key) => {
    const check = tree.checks.find((one) => one.key === key);
    return check === undefined || check.reading !== undefined || figuresOf(check).length === 0;
  });
  expect(idle).toEqual([]);
});
