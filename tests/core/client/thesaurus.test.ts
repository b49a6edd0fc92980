import { describe, expect, it } from "vitest";
import { plainWord, saidIn, stemOf, wordsAkin } from "@/lib/client/plain-words";
import { AKIN, EMPTY, NO, SAME, SAYINGS, WEAK } from "@/lib/client/thesaurus";

const split = (line: string) => line.split(" ");
const said = (text: string) => saidIn(text).map(({ plain }) => plain);
const twice = (list: readonly string[]) => list.filter((one, at) => list.indexOf(one) !== at);

describe("the thesaurus", () => {
  it("gives no word two meanings", () => {
    const perLine = SAME.map((line) => [...new Set(split(line))]);
    expect(twice(perLine.flat())).toEqual([]);
  });

  it("gives no saying two meanings", () => {
    expect(twice(SAYINGS.flatMap((line) => (line.split(" = ")[1] ?? "").split(", ")))).toEqual([]);
  });

  it("keeps words that tell nothing apart out of those that mean something", () => {
    const empty = new Set(EMPTY.flatMap(split));
    expect(SAME.flatMap(split).filter((word) => empty.has(word))).toEqual([]);
    expect([...WEAK.flatMap(split), ...split(NO)].filter((word) => empty.has(word))).toEqual([]);
  });

  it("has sayings of two words or more only, in small letters and without apostrophes, as they are looked up", () => {
    for (const line of SAYINGS) {
      const [means = "", list = ""] = line.split(" = ");
      expect(means).toMatch(/^[a-z]+$/);
      for (const saying of list.split(", ")) expect(saying, line).toMatch(/^[a-z0-9]+( [a-z0-9]+)*$/);
    }
    for (const line of [...SAME, ...AKIN, ...EMPTY, ...WEAK, NO]) expect(line).toMatch(/^[a-z0-9]+( [a-z0-9]+)*$/);
  });

  it("is akin both ways, and nothing to itself", () => {
    for (const word of AKIN.flatMap(split).map(plainWord))
      for (const other of wordsAkin(word)) {
        expect([...wordsAkin(other)], `${word} and ${other}`).toContain(word);
        expect(other).not.toBe(word);
      }
  });
});

describe("plain words", () => {
  it.each([
    ["clicking", "clicks"],
    ["batteries", "battery"],
    ["revs", "rpm"],
    ["stopped", "dies"],
    ["transmission", "gearbox"],
    ["propeller", "prop"],
    ["gasoil", "diesel"],
    ["antifreeze", "coolant"],
    ["wont", "cannot"],
    ["bypassing", "bypassed"],
  ])("reads %s and %s as one", (one, other) => {
    expect(plainWord(one)).toBe(plainWord(other));
  });

  it.each([
    ["starter", "start"],
    ["leak", "leave"],
    ["overheat", "overcharge"],
    ["white", "black"],
    ["tacho", "revs"],
  ])("keeps %s and %s apart", (one, other) => {
    expect(plainWord(one)).not.toBe(plainWord(other));
  });

  it("reads a saying as one word, the longest first", () => {
    expect(said("starter motor")).toEqual(said("starter"));
    expect(said("rev counter")).toEqual(said("tacho"));
    expect(said("conks out all of a sudden")).toEqual(said("stops suddenly"));
    expect(said("packing gland")).toHaveLength(1);
  });

  it("keeps the order, and leaves out what tells nothing", () => {
    expect(said("there is no smoke at the exhaust")).toEqual(["no", "smoke", "exhaust"]);
  });

  it("leaves short words and figures as they are", () => {
    expect(["gas", "co", "2400", "15s"].map(stemOf)).toEqual(["gas", "co", "2400", "15s"]);
  });
});
