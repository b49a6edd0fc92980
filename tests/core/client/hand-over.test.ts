import { describe, expect, it } from "vitest";
import type { HandOverFacts } from "@/lib/client/hand-over/facts";
import { handOverMessage, messageLength } from "@/lib/client/hand-over/message";
import { positionForMessage, positionInFigures, positionSpoken } from "@/lib/client/hand-over/position";
import { radioWords } from "@/lib/client/hand-over/radio-words";

const FACTS: HandOverFacts = {
  boat: "Corncrake",
  engine: "main engine",
  engineIs: ["33 kW"],
  fleet: "Harbour boats",
  by: "Ada",
  hours: "2162 h at the last reading",
  situation: "at-anchor",
  complaint: "wont rev",
  symptoms: ["Will not reach full revs"],
  checked: [
    { title: "Filter vacuum", says: "31 kPa: high" },
    { title: "Bowl", says: "Black specks or slime" },
  ],
  notSeen: ["The bottom and the propeller"],
  tried: [{ title: "New element", says: "No change" }],
  possible: [
    { title: "Primary filter blocked", of100: 58 },
    { title: "Pick-up blocked", of100: 19 },
  ],
  rulesInForce: [],
  notes: [],
  photos: [],
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
  it("says who, what, where, what was found and what it points to, in one message where that can be", () => {
    const text = handOverMessage({ ...FACTS, tried: [] });
    expect(text).toBe(
      "Corncrake, main engine: Will not reach full revs. At anchor 50 12.34N 005 03.21W. Filter vacuum: 31 kPa: high. Maybe Primary filter blocked, 58 of 100. +1 more.",
    );
    expect(messageLength(text)).toEqual({ characters: text.length, messages: 1 });
  });

  it("leaves out what could not be looked at", () => {
    expect(handOverMessage(FACTS)).not.toContain("bottom");
  });

  it("takes a second message rather than leave out the first finding, and says how much was left out", () => {
    const many = Array.from({ length: 30 }, (_, index) => ({ title: `Check number ${index + 1}`, says: "in order as far as can be seen" }));
    const long = { ...FACTS, boat: "The Good Intent of Little Haven", symptoms: ["Will not reach full revs", "Slow to start from cold"] };
    const text = handOverMessage({ ...long, tried: [], checked: many });
    expect(messageLength(text).messages).toBe(2);
    expect(text).toContain("Check number 1:");
    const told = (text.match(/Check number/g) ?? []).length;
    expect(text).toContain(`+${30 - told} more.`);
  });

  it("never leaves out a rule that is in force", () => {
    const rulesInForce = [{ title: "Diesel in the bilge", says: "Engine off." }];
    expect(handOverMessage({ ...FACTS, rulesInForce })).toContain("In force: Diesel in the bilge.");
  });

  it("uses only signs that keep a message at 160 characters", () => {
    const text = handOverMessage({
      ...FACTS,
      tried: [],
      checked: [{ title: "Engine\u2019s thermostat", says: "82 \u00b0C \u2013 in order" }],
    });
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

  it("name what endangers the boat, what was found, and no cause as the likeliest that is not", () => {
    const rulesInForce = [{ title: "Diesel in the bilge", says: "Engine off." }];
    const words = radioWords({ ...FACTS, rulesInForce, possible: [{ title: "Primary filter blocked", of100: 36 }] }).join("\n");
    expect(words).toContain("Danger on board: diesel in the bilge.");
    expect(words).toContain("We found: filter vacuum, 31 kPa: high; bowl, black specks or slime.");
    expect(words).toContain("It may be: primary filter blocked.");
  });

  it("ask for the position where the phone has none", () => {
    expect(radioWords({ ...FACTS, position: null }).join(" ")).toContain("give latitude and longitude");
  });
});
