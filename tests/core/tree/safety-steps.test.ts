import { describe, expect, test } from "vitest";
import { cautionsOf, safetyOf } from "@/lib/core/tree/safety-steps";
import { type EngineState } from "@/lib/core/tree/schema";
import { SafetyFlags } from "@/lib/core/tree/safety-flags";

const wet = { features: { exhaust: "wet", injection: "in-line-pump" } };
const dry = { features: { exhaust: "dry", injection: "in-line-pump" } };
const unknown = { features: {} };
const step = (flags: SafetyFlags, engine: EngineState = "stopped") => ({ flags, engine });
const all = (texts: string[]) => texts.join("\n");
const keys = ({ cautions }: ReturnType<typeof safetyOf>) => cautions.map(({ key }) => key);

test("a step without flags has nothing to add", () => {
  expect(safetyOf(step({}), wet)).toEqual({ first: [], last: [], cautions: [] });
});

describe("opening the raw-water circuit", () => {
  const { first, last } = safetyOf(step({ opensRawWater: true }), wet);

  test("shuts the seacock before anything else and hangs the key on its handle", () => {
    expect(first[0]).toMatch(/^Stop the engine\. Shut the raw-water seacock.*exhaust cock.*hang the engine key on its handle/);
  });

  test("ends in order: open and count, water within 20 s, drips now and after 10 min", () => {
    expect(last[0]).toMatch(/^Open the seacock.*count/);
    expect(last[1]).toMatch(/water must show at the exhaust within 20 s/);
    expect(last[2]).toMatch(/drips at every joint now, and again after 10 min/);
  });

  test("has no exhaust cock to shut on a dry exhaust", () =>
    expect(all(safetyOf(step({ opensRawWater: true }), dry).first)).not.toMatch(/exhaust cock/));

  test("shuts the seacock once, though the step cranks with the fuel off too", () => {
    const both = safetyOf(step({ opensRawWater: true, cranks: 5, fuelOff: true }, "cranking"), wet);
    expect(both.first.filter((text) => /Shut the raw-water seacock/.test(text))).toHaveLength(1);
    expect(both.last.filter((text) => /Open the seacock/.test(text))).toHaveLength(1);
    // The key is needed to crank, so it cannot hang on the handle.
    expect(all(both.first)).not.toMatch(/hang the engine key/);
  });
});

describe("cranking", () => {
  test("on a wet exhaust goes in bursts of 10 s with 60 s rest, and floods after 30 s in all", () => {
    const { first, cautions } = safetyOf(step({ cranks: 25 }, "cranking"), wet);
    expect(all(first)).toMatch(/25 s in all, in bursts of 10 s at most with 60 s rest/);
    expect(cautions.find(({ key }) => key === "cranking-floods")?.says).toMatch(/30 s in all.*shut the seacock and drain the muffler/);
  });

  test("on a dry exhaust has no flooding rule, and the starter's own limit", () => {
    const safety = safetyOf(step({ cranks: 25, fuelOff: true }, "cranking"), dry);
    expect(keys(safety)).not.toContain("cranking-floods");
    expect(all(safety.first)).toMatch(/bursts of 15 s at most/);
    expect(all(safety.first)).not.toMatch(/seacock/);
  });

  test("with an exhaust nobody knows counts as wet", () =>
    expect(keys(safetyOf(step({ cranks: 5 }, "cranking"), unknown))).toContain("cranking-floods"));

  test("warns of water in a cylinder whatever the exhaust", () => {
    for (const profile of [wet, dry]) expect(keys(safetyOf(step({ cranks: 3 }, "cranking"), profile))).toContain("hydraulic-lock");
  });

  test("with the fuel off shuts the seacock first, and opens it before any attempt to run", () => {
    const { first, last } = safetyOf(step({ cranks: 5, fuelOff: true }, "cranking"), wet);
    expect(all(first)).toMatch(/Do not hold a stop button down/);
    expect(all(first)).toMatch(/Shut the raw-water seacock/);
    expect(all(last)).toMatch(/Open the seacock.*before any attempt to run/);
  });

  test("where it may fire leaves the seacock open", () =>
    expect(all(safetyOf(step({ cranks: 5 }, "cranking"), wet).first)).not.toMatch(/seacock/));
});

describe("coolant", () => {
  test("is opened only when a bare hand can rest on the header, and filled with the engine stopped", () => {
    const { first, last, cautions } = safetyOf(step({ opensCoolant: true }, "cold"), wet);
    expect(all(first)).toMatch(/bare hand.*hose is soft/);
    expect(all(last)).toMatch(/engine stopped.*cool fully/);
    expect(cautions[0]).toMatchObject({ signal: "danger", says: expect.stringMatching(/Never taste/) as string });
  });
});

describe("fuel", () => {
  test("on the clean side stays in its bag, is wiped lint-free and never filled from a can", () => {
    const safety = safetyOf(step({ opensFuelClean: true }), wet);
    expect(all(safety.first)).toMatch(/lint-free.*bag/);
    expect(safety.cautions.find(({ key }) => key === "clean-side")?.says).toMatch(/Never fill a new element/);
    expect(keys(safety)).not.toContain("common-rail-closed");
  });

  test.each(["common-rail", "unit-injectors", undefined])("after the last filter stays shut with %s injection", (injection) => {
    const profile = { features: { exhaust: "wet", ...(injection === undefined ? {} : { injection }) } };
    expect(safetyOf(step({ opensFuelClean: true }), profile).cautions[0]).toMatchObject({ key: "common-rail-closed", signal: "danger" });
  });

  test("under high pressure goes through skin: card, never a hand, and to hospital", () => {
    const says = safetyOf(step({ opensHighPressureFuel: true }), wet).cautions.find(({ key }) => key === "injection-jet")?.says;
    expect(says).toMatch(/card, never a hand.*hospital/);
  });
});

describe("hands and bodies", () => {
  test("belts: key out on a stopped engine; idle, hair tied and a second person on a running one", () => {
    expect(all(safetyOf(step({ beltsExposed: true }), wet).first)).toMatch(/key out/);
    const running = safetyOf(step({ beltsExposed: true }, "idling"), wet);
    expect(all(running.first)).toMatch(/idle only.*hair.*second person/);
    expect(running.cautions[0]?.signal).toBe("danger");
    expect(keys(running)).toContain("exhaust-gas-below");
  });

  test("a swimmer goes in at anchor with the key on him, never near shore power", () => {
    const { first, cautions } = safetyOf(step({ inWater: true }), wet);
    expect(first[0]).toMatch(/at anchor.*key on the swimmer.*helper watching/);
    expect(cautions[0]).toMatchObject({ signal: "danger", says: expect.stringMatching(/shore power/) as string });
  });

  test("belts and a crank: the key leaves the pocket for the crank alone, and a second person turns it", () => {
    const { first } = safetyOf(step({ beltsExposed: true, cranks: 5, fuelOff: true }, "cranking"), wet);
    expect(all(first)).toMatch(
      /in your pocket while a hand.*near a belt.*only for the crank, with everyone clear, and a second person turns it/,
    );
    expect(all(first)).not.toMatch(/key out and in your pocket, before/);
  });

  test("belts turning: idle holds while the engine box is open, so full revs with the box shut are no contradiction", () =>
    expect(all(safetyOf(step({ beltsExposed: true }, "idling"), wet).first)).toMatch(/^While the engine box is open: .*fast idle only/));

  test("a shaft that sail, tow or stream could turn is lashed first, and let go last", () => {
    const { first, last } = safetyOf(step({ handsAtShaft: true }), wet);
    expect(all(first)).toMatch(
      /in neutral.*\nUnder sail, in tow or in a stream.*anchored or moored, and the shaft lashed.*Off again before.*before the engine is started/,
    );
    expect(last.at(-1)).toMatch(/^Lashing off/);
  });

  test("a battery's leads go back with the bilge pump's supply, tried", () =>
    expect(all(safetyOf(step({ worksOnBattery: true }), wet).last)).toMatch(/negative on last.*bilge pump back on automatic, and tried/));

  test("a shaft is touched with the engine stopped and the key in the pocket", () =>
    expect(safetyOf(step({ handsAtShaft: true }), wet).first[0]).toMatch(/gear in neutral, key out/));

  test("full throttle is for clear water, not for the lines", () =>
    expect(all(safetyOf(step({ underLoad: true }, "under-load"), wet).first)).toMatch(/two thirds throttle, 10 s at most.*only under way/));

  test("a battery: negative off first and on last, no lithium beside lead", () => {
    const { first, last, cautions } = safetyOf(step({ worksOnBattery: true }), wet);
    expect(all(first)).toMatch(/negative first/);
    expect(all(last)).toMatch(/negative on last/);
    expect(cautions[0]?.says).toMatch(/lithium/);
  });
});

test("every flag that can hurt writes something", () => {
  const silent = Object.keys(SafetyFlags.shape).filter((flag) => {
    const flags = flag === "cranks" ? { cranks: 5 } : flag === "fuelOff" ? { cranks: 5, fuelOff: true as const } : { [flag]: true };
    const without = flag === "fuelOff" ? safetyOf(step({ cranks: 5 }), wet) : safetyOf(step({}), wet);
    const { first, last, cautions } = safetyOf(step(flags), wet);
    return first.length + last.length + cautions.length <= without.first.length + without.last.length + without.cautions.length;
  });
  expect(silent).toEqual([]);
});

describe("all cautions of a step", () => {
  const tree = {
    cautions: [
      { key: "gloves", signal: "notice" as const, says: "Wear gloves.", sources: ["judgement"] },
      { key: "fuel-spill", signal: "danger" as const, says: "In the author's words.", sources: ["judgement"] },
    ],
  };

  test("stand worst first, written and cited together", () => {
    const signals = cautionsOf({ ...step({ opensCoolant: true, hotParts: true }, "cold"), cautions: ["gloves"] }, tree, wet).map(
      ({ signal }) => signal,
    );
    expect(signals).toEqual(["danger", "warning", "notice"]);
  });

  test("are each said once, in the author's words where he wrote them", () => {
    const fuel = cautionsOf({ ...step({ opensFuelDirty: true }), cautions: ["fuel-spill"] }, tree, wet).filter(
      ({ key }) => key === "fuel-spill",
    );
    expect(fuel).toEqual([{ key: "fuel-spill", signal: "danger", says: "In the author's words." }]);
  });
});
