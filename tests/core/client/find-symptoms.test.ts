import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { symptomFinder } from "@/lib/client/find-symptoms";
import { complaintsOf } from "@/lib/client/plain-words";
import type { Symptom } from "@/lib/core/tree/schema";

const symptom = (key: string, title: string, detail: string, phrases: string[]): Symptom => ({
  key,
  title,
  detail,
  system: "fuel-supply",
  phrases,
  sources: ["users"],
});

const SYMPTOMS = [
  symptom("hard-start-cold", "Slow to start from cold", "It needs long cranking after a night", [
    "slow to start in the morning",
    "takes ages to fire up",
    "cold start trouble",
    "won't start first time",
    "have to crank and crank",
  ]),
  symptom("lost-top-end-rpm", "Will not reach full revs", "In gear, at full throttle", [
    "won't rev out",
    "down on revs",
    "lost top end",
    "no full throttle",
    "slow boat",
  ]),
  symptom("fades-and-stops", "Fades, then stops", "Loses revs over seconds under load", [
    "fades when pushed",
    "starved",
    "ran out of puff",
    "petered out",
    "gasping",
  ]),
  symptom("overheat", "Overheats", "Needle high or the alarm", ["running hot", "temp alarm", "boiling", "needle in red", "too hot"]),
];
const find = symptomFinder(SYMPTOMS);
const ticked = (text: string) =>
  find(text)
    .filter(({ fits }) => fits)
    .map(({ key }) => key);

describe("finding a symptom by plain words", () => {
  it("takes one line apart at commas and joining words", () => {
    expect(complaintsOf("Won't rev, fadse when pushd and it's hot; then dies")).toEqual([
      "wont rev",
      "fadse when pushd",
      "its hot",
      "dies",
    ]);
  });

  it("ticks each of two complaints in one misspelt line", () => {
    expect(ticked("wont rev, fadse when pushd")).toEqual(["lost-top-end-rpm", "fades-and-stops"]);
  });

  it("finds a symptom by words that stand in none of its phrases in this order", () => {
    expect(ticked("takes forever to start")).toEqual(["hard-start-cold"]);
  });

  it("reads an apostrophe, a capital and a full stop as nothing", () => {
    expect(find("WON'T REV OUT.")).toEqual(find("wont rev out"));
  });

  it("finds nothing, and ticks nothing, where nothing is alike", () => {
    expect(find("zzzz qqqq")).toEqual([]);
    expect(find("")).toEqual([]);
    expect(find("  , and ")).toEqual([]);
  });

  it("ticks at most one symptom for each complaint, and never falls over", () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 80 }), (text) => {
        expect(ticked(text).length).toBeLessThanOrEqual(Math.max(0, complaintsOf(text).length));
      }),
    );
  });

  it.each([
    "won't turn over just clicks",
    "won't start, just clicks",
    "fuel everywhere",
    "oil in the water",
    "no water out the back",
    "beeping alarm and steam",
    "black smoke",
    "smells funny",
  ])("ticks nothing for %s where no symptom says so: a wrong one leads to the wrong end of the engine", (complaint) => {
    expect(symptomFinder(SYMPTOMS.slice(0, 2))(complaint).filter(({ fits }) => fits)).toEqual([]);
  });

  it("ticks neither of two that the words do not tell apart, and offers both", () => {
    const both = symptomFinder([
      ...SYMPTOMS.slice(0, 1),
      symptom("hard-start-hot", "Will not restart warm", "After a run", ["won't start once warm"]),
    ]);
    expect(both("wont start").map(({ fits }) => fits)).toEqual([false, false]);
  });

  it.each([
    ["engin dies when pushd", "fades-and-stops"],
    ["takes for ever to fire", "hard-start-cold"],
    ["lost top-end", "lost-top-end-rpm"],
    ["not getting full throtle", "lost-top-end-rpm"],
  ])("knows %s by everyday words for the same thing, and by slips of the finger", (complaint, key) => {
    expect(find(complaint)[0]?.key).toBe(key);
  });

  it("gives the same order for the same words, whatever order the symptoms' rivals tie in", () => {
    expect(find("start")).toEqual(symptomFinder([...SYMPTOMS])("start"));
    const scores = find("slow revs under load").map(({ fits, score }) => [fits ? 0 : 1, score] as const);
    expect(scores).toEqual([...scores].sort((a, b) => a[0] - b[0] || a[1] - b[1]));
  });

  it("offers the nearest, unticked and marked, where nothing says just that", () => {
    const hits = find("the needle fell off and rolled away into the cold dark sea");
    expect(hits.map(({ key }) => key)).toContain("overheat");
    expect(hits.length).toBeLessThanOrEqual(3);
    expect(hits.every(({ weak, fits }) => weak && !fits)).toBe(true);
  });

  it("marks nothing that is ticked as a guess", () => {
    for (const text of ["wont rev, fadse when pushd", "too hot", "takes forever to start"])
      for (const { fits, weak } of find(text)) expect(fits && weak).toBe(false);
  });

  it("puts the ticked ones first, in the order they were said", () => {
    expect(ticked("fades when pushed, running hot")).toEqual(["fades-and-stops", "overheat"]);
    expect(ticked("running hot, fades when pushed")).toEqual(["overheat", "fades-and-stops"]);
  });

  it("ticks nothing for words that half the tree has, and what people say word for word all the same", () => {
    const starts = ["morning", "lunch", "winter", "berth"].map((when) =>
      symptom(`start-${when}`, `Will not start at ${when}`, "It does not start", [`won't start in the ${when}`]),
    );
    const among = symptomFinder([...SYMPTOMS, ...starts, symptom("no-start", "Will not start", "Never", ["won't start"])]);
    const ticks = (text: string) => among(text).flatMap(({ key, fits }) => (fits ? [key] : []));
    expect(ticks("wont start")).toEqual(["no-start"]);
    expect(symptomFinder([...SYMPTOMS, ...starts])("wont start").some(({ fits }) => fits)).toBe(false);
  });
});
