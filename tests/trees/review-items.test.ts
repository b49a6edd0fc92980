import { beforeAll, describe, expect, test } from "vitest";
import { shippedTree } from "../support/shipped-tree";
import { Look } from "./review-look";
import { IN_WORDS, REVIEW_ITEMS } from "./review-items";

let look: Look;
beforeAll(async () => {
  look = new Look(await shippedTree());
}, 30_000);

describe("a mechanic's review of the tree, item by item", () => {
  test.each(REVIEW_ITEMS)("$item: $about", ({ must }) => {
    const broken = Object.entries(must).flatMap(([says, holds]) => (holds(look) ? [] : [says]));
    expect(broken).toEqual([]);
  });

  test("each of the 76 items stands once, as something that must hold or in words", () => {
    const numbers = [...REVIEW_ITEMS.map(({ item }) => item), ...IN_WORDS.map(({ item }) => item)].sort((a, b) => a - b);
    expect(numbers).toEqual(Array.from({ length: 76 }, (_, index) => index + 1));
  });

  test("an unknown key is a fault, not an absence", () => {
    expect(() => look.check("no-such-check")).toThrow(/no check/);
    expect(() => look.gives("water-in-cylinder", "bar-over", "no-such-finding")).toThrow(/no finding of bar-over/);
    expect(() => look.asks("fire", "no-such-symptom")).toThrow(/no symptom/);
  });
});

describe("the first screen of each symptom", () => {
  test("asks seven questions about danger at most, the four of every boat among them", () => {
    for (const { key } of look.tree.symptoms) {
      const asked = look.tree.stopRules.filter((rule) => look.asks(rule.key, key)).map((rule) => rule.key);
      expect(asked, key).toEqual(expect.arrayContaining(["sea-room", "fire", "flooding", "fuel-in-bilge"]));
      expect(asked.length, `${key}: ${asked.join(", ")}`).toBeLessThanOrEqual(7);
    }
  });

  // A cause that kills, sinks or wrecks, the symptoms by which it is met, and the question that has to stand before any step.
  test.each([
    ["co", ["exhaust-fumes-cabin", "water-in-engine-space"]],
    ["battery-swelling", ["overcharging", "battery-goes-flat", "no-crank-click", "no-crank-silent", "cranks-slow"]],
    ["hydraulic-lock", ["crank-stops-hard", "no-crank-click", "cranks-slow", "cranks-no-start-smoke", "cranks-no-start-no-smoke"]],
    ["hydraulic-lock", ["hard-start-cold", "hard-start-hot"]],
    [
      "crank-floods-exhaust",
      ["cranks-no-start-smoke", "cranks-no-start-no-smoke", "starts-then-dies", "hard-start-cold", "hard-start-hot"],
    ],
    ["sump-over-full", ["oil-level-rising", "smoke-blue", "crankcase-fumes", "low-oil-pressure"]],
    ["runaway", ["runaway", "wont-stop"]],
    ["shaft-or-boot", ["no-drive", "shaft-gland-leak", "vibration", "water-in-engine-space"]],
    ["wrong-fuel-taken", ["knock-combustion", "misfire-rough", "starts-then-dies", "fades-and-stops", "cranks-no-start-smoke"]],
    ["too-hot-now", ["overheat", "coolant-loss", "no-raw-water", "exhaust-steam"]],
    ["running-dry", ["no-raw-water", "exhaust-steam", "exhaust-temp-alarm"]],
    ["stopped-with-a-bang", ["stops-suddenly", "crank-stops-hard"]],
    ["no-oil-pressure", ["low-oil-pressure", "gauge-alarm-wrong", "noise-mechanical", "stops-suddenly"]],
    ["knock", ["noise-mechanical", "vibration", "low-oil-pressure"]],
    ["fuel-mist", ["fuel-leak"]],
    ["water-at-the-pump", ["water-in-separator"]],
    ["coolant-in-cylinder", ["coolant-loss", "smoke-white"]],
    ["oil-milky", ["oil-milky"]],
    ["stuck-in-gear", ["stuck-in-gear"]],
    ["wont-stop", ["wont-stop"]],
    ["starter-runs-on", ["starter-runs-on"]],
  ])("%s is asked with %j", (rule, symptoms) => {
    expect(symptoms.filter((symptom) => !look.asks(rule, symptom))).toEqual([]);
  });
});

describe("what no step may leave out", () => {
  test("an engine turned by hand is turned by the wrist", () => {
    const words = /engine (over )?by hand|two full turns|half to one turn|a quarter of a turn|crank nut/i;
    const turned = look.steps().filter((step) => step.who.startsWith("skipper") && words.test(step.steps.join(" ")));
    expect(turned.length).toBeGreaterThan(9);
    const bare = turned.filter((step) => !look.cautions(step).includes("bar-by-wrist"));
    expect(bare.map(({ key }) => key)).toEqual([]);
  });

  test("hands at a shaft are told that sail and stream turn it in neutral", () => {
    const steps = look.steps().filter((step) => step.flags.handsAtShaft && step.who.startsWith("skipper"));
    expect(steps.length).toBeGreaterThan(12);
    expect(steps.filter((step) => !/sail.*turns the shaft in neutral/.test(look.shown(step))).map(({ key }) => key)).toEqual([]);
  });

  test("full throttle without load is never asked without its caution", () => {
    const asks = ["rpm-noload", "neutral-vs-gear", "vibration-neutral-sweep"];
    expect(asks.filter((key) => !look.cautions(look.check(key)).includes("full-throttle-no-load"))).toEqual([]);
  });

  test("full throttle in gear is asked under way only", () => {
    const asks = look
      .steps()
      .flatMap((step) => step.steps.map((text) => ({ key: step.key, text })))
      .filter(({ text }) => /full (throttle|load).{0,30}(in gear|minutes)|in gear at full throttle/i.test(text));
    expect(asks.length).toBeGreaterThan(4);
    const loose = asks.filter(({ key, text }) => {
      const step = look.steps().find((one) => one.key === key);
      return (
        !/under way|clear water|open water|not run it up in gear/i.test(text) && step?.appliesTo?.situations?.includes("under-way") !== true
      );
    });
    expect(loose.map(({ key }) => key)).toEqual([]);
  });

  test("a bilge pump that is put off is put back, and the bilge looked at meanwhile", () => {
    for (const { key, says } of look.tree.stopRules) {
      const text = says.join(" ");
      if (!/bilge pump off/i.test(text)) continue;
      expect(text, key).toMatch(/every 15 minutes/);
      expect(text, key).toMatch(/back on automatic, and tested/);
    }
    for (const key of ["replace-battery", "clean-connections", "isolate-start", "bypass-battery-switch", "drain-find"])
      expect(look.cautions(look.remedy(key)), key).toContain("bilge-pump-back");
    expect(look.cautions(look.check("disconnect-overnight"))).toContain("bilge-pump-back");
  });

  test("a remedy that only gets one home is marked so, and says that the cause stays", () => {
    const home = look.tree.remedies.filter(({ title }) => /get home/i.test(title));
    expect(home.length).toBeGreaterThan(6);
    expect(home.filter(({ temporary }) => temporary !== true).map(({ key }) => key)).toEqual([]);
  });

  test("nobody swims but at anchor", () => {
    const swims = look.steps().filter((step) => step.flags.inWater);
    expect(swims.length).toBeGreaterThan(3);
    expect(swims.filter((step) => step.appliesTo?.situations?.join() !== "at-anchor").map(({ key }) => key)).toEqual([]);
    expect(
      swims.filter((step) => !/shore power/.test(look.shown(step)) || !/cold water/i.test(look.shown(step))).map(({ key }) => key),
    ).toEqual([]);
  });
});
