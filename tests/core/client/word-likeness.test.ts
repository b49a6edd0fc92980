import { describe, expect, it } from "vitest";
import { wordFinder, wordLikeness } from "@/lib/client/word-likeness";

const find = wordFinder(["exhaust", "throttle", "temperature", "drinking", "starter", "start", "steam", "gearbox", "alternator", "stern"]);
const nearest = (typed: string) => find(typed)[0]?.word ?? null;

describe("a misspelt word", () => {
  it.each([
    ["exaust", "exhaust"],
    ["throtle", "throttle"],
    ["temprature", "temperature"],
    ["stater", "starter"],
    ["steem", "steam"],
    ["geerbox", "gearbox"],
    ["alternater", "alternator"],
    ["exhuast", "exhaust"],
  ])("%s is %s", (typed, meant) => {
    expect(nearest(typed)).toBe(meant);
  });

  it("that is a word not typed to its end finds those it may become", () => {
    expect(find("ste").map(({ word }) => word)).toEqual(["steam", "stern"]);
  });

  it("that is known is itself alone", () => {
    expect(find("start")).toEqual([{ word: "start", like: 1 }]);
  });

  it.each(["drifting", "zz", "x", "2400", "horse", ""])("%s stands for nothing known", (typed) => {
    expect(find(typed)).toEqual([]);
  });

  it("is less alike the more slips it has, and not at all past what is allowed", () => {
    expect(wordLikeness("alternator", "alternator")).toBe(1);
    expect(wordLikeness("alternater", "alternator")).toBeGreaterThan(wordLikeness("altrnater", "alternator"));
    expect(wordLikeness("altrnter", "alternator")).toBeGreaterThanOrEqual(0);
    expect(wordLikeness("atrnter", "alternator")).toBe(0);
    expect(wordLikeness("oil", "oat")).toBe(0);
  });

  it("gives the same answer when it is asked again", () => {
    expect(find("exaust")).toBe(find("exaust"));
  });
});
