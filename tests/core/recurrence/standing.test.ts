import { describe, expect, it } from "vitest";
import { hereBefore, standings } from "../../../lib/core/recurrence/standing";
import { upstreamIn } from "../../../lib/core/recurrence/upstream";
import { aCase, inWords } from "./a-case";

describe("standings", () => {
  it("[S1][S2][S3] counts, says when it came back, and how long the last has held", () => {
    const [first, second, third] = [aCase(1, 100), aCase(10, 160), aCase(20, 190)];
    const found = standings([third, first, second], () => 215);
    expect(found.get(first.id)).toEqual({ timesHere: 1, cameBackAfterHours: 60, heldHours: null });
    expect(found.get(second.id)).toEqual({ timesHere: 2, cameBackAfterHours: 30, heldHours: null });
    expect(found.get(third.id)).toEqual({ timesHere: 3, cameBackAfterHours: null, heldHours: 25 });
  });

  it("[S1] gives an entry that is no case nothing", () => {
    const open = aCase(1, 100, { outcome: null, cause: null });
    expect(standings([open], () => 200).get(open.id)).toEqual({ timesHere: 0, cameBackAfterHours: null, heldHours: null });
  });

  it("[S3] does not know how long it held where hours are unknown, or where it was handed over", () => {
    const [unknown, towed] = [aCase(1, null), aCase(1, 100, { outcome: "handed-over", engineId: "engine-2" })];
    const found = standings([unknown, towed], () => 200);
    expect(found.get(unknown.id)?.heldHours).toBeNull();
    expect(found.get(towed.id)?.heldHours).toBeNull();
  });

  it("[S2] puts the return on the cure, not on the tow before it", () => {
    const [towed, cured, again] = [aCase(1, 100, { outcome: "handed-over" }), aCase(2, 100), aCase(9, 130)];
    const found = standings([towed, cured, again], () => 130);
    expect(found.get(towed.id)).toMatchObject({ timesHere: 1, cameBackAfterHours: null });
    expect(found.get(cured.id)).toMatchObject({ timesHere: 1, cameBackAfterHours: 30 });
  });
});

describe("hereBefore", () => {
  it("finds earlier appearances of a cause on this engine, in words too", () => {
    const [first, second] = [aCase(1, 100, { cause: inWords("Impeller torn") }), aCase(10, 160, { cause: inWords("impeller  torn") })];
    expect(hereBefore([second, first], "engine-1", { key: null, title: "IMPELLER TORN" })).toEqual({ times: 2, last: second });
    expect(hereBefore([second, first], "engine-2", { key: null, title: "impeller torn" })).toEqual({ times: 0, last: null });
  });

  it("[C4] counts a spell that was only nursed home as having been here", () => {
    const nursed = aCase(1, 100, { outcome: "held", temporary: true });
    expect(hereBefore([nursed], "engine-1", { key: "primary-filter-blocked", title: "x" })).toEqual({ times: 1, last: nursed });
  });
});

describe("upstreamIn", () => {
  const cause = {
    key: "",
    title: "",
    system: "fuel-supply",
    is: "x",
    base: "common",
    onset: "gradual",
    shows: {},
    gives: {},
    curedBy: {},
    broughtOnBy: {},
    roots: [],
    sources: ["judgement"],
  } as const;

  it("[B5] ranks what brings a cause on, then its roots in words", () => {
    const upstream = upstreamIn({
      causes: [
        {
          ...cause,
          key: "filter",
          title: "Filter blocked",
          sources: ["judgement"],
          roots: ["Fuel taken on from drums"],
          broughtOnBy: { water: "sometimes", growth: "often" },
        },
        { ...cause, key: "growth", title: "Growth in the tank", sources: ["judgement"], roots: [] },
        { ...cause, key: "water", title: "Water in the tank", sources: ["judgement"], roots: [] },
      ],
    });
    expect(upstream("filter")).toEqual([
      { cause: "growth", title: "Growth in the tank", share: 0.66 },
      { cause: "water", title: "Water in the tank", share: 0.33 },
      { cause: null, title: "Fuel taken on from drums", share: null },
    ]);
    expect(upstream("in-words-impeller-abc")).toEqual([]);
  });
});
