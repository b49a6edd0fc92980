import { describe, expect, it } from "vitest";
import { readKept, withKept } from "@/lib/client/kept-changes";
import { basisOf, FOLLOWS_THE_CURE, OWN_WORDS, outcomeOf, type OutcomeForm } from "@/lib/client/outcome-form";
import { OutcomePayload } from "@/lib/core/contract/event";

const FORM: OutcomeForm = {
  outcome: "cured",
  cause: "primary-filter-blocked",
  causeInWords: "",
  remedy: "renew-primary-element",
  remedyInWords: "",
  proof: "Ten minutes at full throttle",
  hours: "2184,5",
  meterReset: false,
  minutes: "40",
  parts: [{ key: "primary-element", title: "Element", quantity: 1 }],
  note: " ",
};
const given = (form: Partial<OutcomeForm>, last: number | null = 2162) => outcomeOf({ ...FORM, ...form }, last);

describe("the outcome that is logged", () => {
  it("is what was typed, in the shape the server takes, with nothing that was not said", () => {
    const read = given({});
    expect("outcome" in read && OutcomePayload.parse(read.outcome)).toEqual({
      outcome: "cured",
      cause: "primary-filter-blocked",
      remedy: "renew-primary-element",
      proof: "Ten minutes at full throttle",
      engineHours: 2184.5,
      minutes: 40,
      parts: [{ key: "primary-element", title: "Element", quantity: 1 }],
    });
  });

  it("asks when the hours are less than before, and takes them when the meter was replaced", () => {
    expect(given({ hours: "2100" })).toMatchObject({ errors: { hours: expect.stringContaining("2162") as string } });
    expect(given({ hours: "12", meterReset: true })).toMatchObject({ outcome: { engineHours: 12, meterReset: true } });
    expect(given({ hours: "12" }, null)).toMatchObject({ outcome: { engineHours: 12 } });
  });

  it("calls nothing cured that was not proved, and names a cause for each cure", () => {
    expect(given({ proof: " " })).toMatchObject({ errors: { proof: expect.any(String) as string } });
    expect(given({ cause: "" })).toMatchObject({ errors: { cause: expect.any(String) as string } });
    expect(given({ outcome: "held", proof: "" })).toMatchObject({ outcome: { outcome: "held" } });
  });

  it("keeps the person's own words apart from the tree's keys", () => {
    const read = given({ cause: OWN_WORDS, causeInWords: "Rag in the intake", remedy: OWN_WORDS, remedyInWords: "Pulled it out" });
    expect(read).toMatchObject({ outcome: { causeInWords: "Rag in the intake", remedyInWords: "Pulled it out" } });
    expect("outcome" in read && read.outcome.cause).toBeUndefined();
  });

  it("asks for the words where a cure is put down to something in one's own words", () => {
    expect(given({ cause: OWN_WORDS, causeInWords: "  " })).toMatchObject({ errors: { cause: expect.any(String) as string } });
  });

  it("is filled in afresh when something else has cured it since, but for what was typed of hours and notes", () => {
    const fresh = { ...FORM, hours: "", note: "" };
    const kept = { basis: "", changes: { outcome: "broken-off", cause: "", remedy: "", hours: "2190", note: "wet" } };
    const cured = basisOf({ curedCause: { cause: "x", remedy: "y", temporary: false, proof: null }, runsAgain: false });
    expect(withKept(fresh, kept, cured, FOLLOWS_THE_CURE)).toEqual({ ...fresh, hours: "2190", note: "wet" });
    expect(withKept(fresh, kept, "", FOLLOWS_THE_CURE)).toMatchObject({ outcome: "broken-off", cause: "", hours: "2190" });
  });

  it("leaves out parts of which none was used", () => {
    const read = given({ parts: [{ key: null, title: "Washer", quantity: 0 }] });
    expect("outcome" in read && read.outcome.parts).toEqual([]);
  });
});

describe("a form that was kept", () => {
  it("fills in what was not typed from now, and lets nothing odd from an earlier version in", () => {
    const kept = readKept(JSON.stringify({ basis: "", changes: { note: "half a", parts: "none", gone: 1 } }));
    expect(withKept({ note: "", parts: [1], minutes: 12 }, kept, "", [])).toEqual({ note: "half a", parts: [1], minutes: 12 });
  });

  it("is nothing where what was kept cannot be read", () => {
    expect([null, "", "{", "null", "7", '{"note":"x"}', '{"basis":1,"changes":{}}'].map(readKept)).toEqual(Array(7).fill(null));
  });
});
