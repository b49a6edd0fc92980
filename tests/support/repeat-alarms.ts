import { assess, FALSE_ALARM_LEVEL } from "@/lib/core/recurrence/assess";
import { asOf, dice, simulatedFleet } from "./simulated-fleet";

/** Fleets of healthy engines: small and large, few causes and many, alike and unlike. */
export const HEALTHY_FLEETS = [
  { key: "oneRecord", name: "one engine, one cause, 12 faults", engines: 1, causes: 1, expected: 12, hours: 4000, shape: Infinity },
  { key: "tenCauses", name: "one engine, ten causes, 8 faults each", engines: 1, causes: 10, expected: 8, hours: 4000, shape: 2 },
  {
    key: "fiveAlike",
    name: "five engines, six causes, 6 faults each, alike",
    engines: 5,
    causes: 6,
    expected: 6,
    hours: 4000,
    shape: Infinity,
  },
  { key: "fiveUnlike", name: "five engines, six causes, 6 faults each, unlike", engines: 5, causes: 6, expected: 6, hours: 4000, shape: 2 },
  {
    key: "thirtyVeryUnlike",
    name: "thirty engines, four causes, 5 faults each, very unlike",
    engines: 30,
    causes: 4,
    expected: 5,
    hours: 4000,
    shape: 1,
  },
] as const;

/** A worsening engine in a healthy fleet: power-law growth, so many faults expected over its life. */
export const WORSENING = [
  { beta: 1.5, expected: 8 },
  { beta: 2, expected: 8 },
  { beta: 3, expected: 8 },
  { beta: 1.5, expected: 15 },
  { beta: 2, expected: 15 },
  { beta: 3, expected: 15 },
] as const;

/**
 * The share of healthy fleets that ever heard a false alarm, looked at after every quarter of their life and at its end (each look takes in all faults before it).
 * Both words: getting worse, oftener than the fleet.
 */
export function falseAlarms(fleet: (typeof HEALTHY_FLEETS)[number], runs: number, seed: number): { worse: number; oftener: number } {
  const roll = dice(seed);
  let worse = 0;
  let oftener = 0;
  for (let run = 0; run < runs; run++) {
    const simulated = simulatedFleet(fleet, roll);
    const looks = [0.25, 0.5, 0.75, 1].map((share) => {
      const { entries, engines } = asOf(simulated, fleet.hours * share);
      return assess(entries, engines);
    });
    if (looks.some((look) => look.some(({ trend }) => trend.saidAt !== null))) worse++;
    if (looks.some((look) => look.some(({ frequency }) => frequency.verdict === "oftener"))) oftener++;
  }
  return { worse: worse / runs, oftener: oftener / runs };
}

/** How much a share over so many runs lies over the level, beyond what the luck of the draw makes 1 time in 1000; at most 0 if the level is held. */
export const excessOverLevel = (share: number, runs: number): number =>
  share - FALSE_ALARM_LEVEL - 3.09 * Math.sqrt((FALSE_ALARM_LEVEL * (1 - FALSE_ALARM_LEVEL)) / runs);

/** The share of worsening engines that are said to be, by the end of their life; alone under watch, as a fleet's first record is. */
export function power(engine: (typeof WORSENING)[number], runs: number, seed: number): number {
  const roll = dice(seed);
  let said = 0;
  for (let run = 0; run < runs; run++) {
    const { entries, engines } = simulatedFleet({ engines: 1, causes: 1, hours: 4000, shape: Infinity, ...engine }, roll);
    if (assess(entries, engines).some(({ trend }) => trend.saidAt !== null)) said++;
  }
  return said / runs;
}

/** One engine at `times` the fleet's rate among nine that are alike: the share of runs in which it is said to be oftener. */
export function powerOftener(times: number, expected: number, runs: number, seed: number): number {
  const roll = dice(seed);
  let said = 0;
  for (let run = 0; run < runs; run++) {
    const fleet = simulatedFleet({ engines: 9, causes: 1, hours: 4000, shape: Infinity, expected }, roll);
    const bad = simulatedFleet({ engines: 1, causes: 1, hours: 4000, shape: Infinity, expected: expected * times }, roll);
    const engines = [...fleet.engines, ...bad.engines.map((engine) => ({ ...engine, id: "bad" }))];
    const entries = [...fleet.entries, ...bad.entries.map((entry) => ({ ...entry, engineId: "bad", id: `bad-${entry.id}` }))];
    if (assess(entries, engines).some(({ engineId, frequency }) => engineId === "bad" && frequency.verdict === "oftener")) said++;
  }
  return said / runs;
}
