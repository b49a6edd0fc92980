import { describe, expect, it } from "vitest";
import type { HandOverFacts } from "@/lib/client/hand-over/facts";
import { handOverMessage, messageLength } from "@/lib/client/hand-over/message";
import { positionForMessage, positionInFigures, positionSpoken } from "@/lib/client/hand-over/position";
import { radioWords } from "@/lib/client/hand-over/radio-words";

const FACTS: HandOverFacts = {
  boat: "Corncrake",
  engine: "main engine",
  engineIs: ["33 kW"],
  hours: 2162,
  situation: "at-anchor",
  complaint: "wont rev",
  symptoms: ["Will not reach full revs"],
  checked: [
    { title: "Bowl", says: "Black specks or slime" },
    { title: "Filter vacuum", says: "31 kPa: high" },
  ],
  tried: [{ title: "New element", says: "No change" }],
  possible: [
    { title: "Primary filter blocked", of100: 58 },
    { title: "Pick-up blocked", of100: 19 },
  ],
  rulesInForce: [],
  crankSeconds: 0,
  minutes: 40,
  position: { latitude: 50.205666, longitude: -5.0535, at: "2026-06-01T08:00:00Z" },
};

describe("the position", () => {
  it("is written as charts do, in degrees and minutes", () => {
    expect(positionInFigures(FACTS.position!)).toBe("50\u00b012.34\u2032 N 005\u00b003.21\u2032 W");
    expect(positionForMessage(FACTS.position!)).toBe("50 12.34N 005 03.21W");
  });

  it("never has sixty minutes", () => {
    expect(positionForMessage({ latitude: 49.999999, longitude: 179.999999, at: "" })).toBe("50 00.00N 180 00.00E");
  });

  it("is read out digit by digit", () => {
    expect(positionSpoken({ latitude: -9.5, longitude: 0, at: "" })).toBe(
      "zero nine degrees, three zero decimal zero zero minutes south; zero zero zero degrees, zero zero decimal zero zero minutes east",
    );
  });
});

describe("the hand-over as a text message", () => {
  it("says who, what, where and the likeliest first, then the tried and the latest findings", () => {
    expect(handOverMessage(FACTS)).toBe(
      "Corncrake, main engine: Will not reach full revs. At anchor 50 12.34N 005 03.21W. Likeliest: Primary filter blocked 58/100, Pick-up blocked 19/100. " +
        "Tried New element: No change. Filter vacuum: 31 kPa: high. Bowl: Black specks or slime.",
    );
  });

  it("fits into two messages however much was found, and says how much was left out", () => {
    const many = Array.from({ length: 30 }, (_, index) => ({ title: `Check number ${index + 1}`, says: "in order as far as can be seen" }));
    const text = handOverMessage({ ...FACTS, checked: many });
    expect(messageLength(text).messages).toBeLessThanOrEqual(2);
    expect(text).toMatch(/ \+\d+ more\.$/);
    const told = (text.match(/Check number/g) ?? []).length;
    expect(text).toContain(`+${30 - told} more.`);
  });

  it("never leaves out a rule that is in force", () => {
    expect(handOverMessage({ ...FACTS, rulesInForce: ["Do not crank again"] })).toContain("Do not crank again.");
  });

  it("uses only signs that keep a message at 160 characters", () => {
    const text = handOverMessage({ ...FACTS, checked: [{ title: "Engine\u2019s thermostat", says: "82 \u00b0C \u2013 in order" }] });
    expect(text).toContain("Engine's thermostat: 82  degC - in order.");
    expect(messageLength(text).messages).toBe(text.length <= 160 ? 1 : Math.ceil(text.length / 153));
  });
});

describe("the length of a text message", () => {
  it("is counted as networks cut it", () => {
    expect(messageLength("a".repeat(160))).toEqual({ characters: 160, messages: 1 });
    expect(messageLength("a".repeat(161))).toEqual({ characters: 161, messages: 2 });
    expect(messageLength("a".repeat(307))).toEqual({ characters: 307, messages: 3 });
    expect(messageLength("\u2603".repeat(71)).messages).toBe(2);
  });
});

describe("the words for the radio", () => {
  it("give the boat three times, the position, the fault and what is still to be filled in", () => {
    const words = radioWords(FACTS).join("\n");
    expect(words).toContain("This is Corncrake, Corncrake, Corncrake.");
    expect(words).toContain("five zero degrees, one two decimal three four minutes north");
    expect(words).toContain("will not reach full revs");
    expect(words).toContain("how many people");
  });

  it("ask for the position where the phone has none", () => {
    expect(radioWords({ ...FACTS, position: null }).join(" ")).toContain("give latitude and longitude");
  });
});
