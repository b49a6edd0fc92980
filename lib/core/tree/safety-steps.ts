import type { EngineProfile } from "../contract/engine";
import type { Check, FaultTree, Remedy, Signal } from "./schema";
import type { SafetyFlags } from "./safety-flags";
import { treatedAsRail } from "./treated-as-rail";

/** A signal word in the sense of ANSI Z535: danger kills or maims, warning could, caution could injure or do damage. */
export type StepCaution = { key: string; signal: Signal; says: string };

/** What comes before a step's own list, after it, and over it. */
export type StepSafety = { first: string[]; last: string[]; cautions: StepCaution[] };

type Step = Pick<Check | Remedy, "flags" | "engine">;

/** What the rules look at: the flags, and the few facts about step and engine that change the wording. */
type Facts = SafetyFlags & { running: boolean; wetExhaust: boolean; rail: boolean; opensWater: boolean };

type Rule = { holds: (facts: Facts) => unknown; first?: (facts: Facts) => string; last?: (facts: Facts) => string; caution?: StepCaution };

/**
 * The safety steps and cautions of a check or remedy, written from its flags,
 * so that none is forgotten. A feature that the profile does not know counts
 * as the more dangerous one: wet exhaust, common rail.
 *
 * The figures (10 s bursts, 60 s rest, 30 s in all, water within 20 s, a second
 * look after 10 min) are common practice; makers' figures go before them.
 */
export function safetyOf(step: Step, profile: Pick<EngineProfile, "features">): StepSafety {
  const facts: Facts = {
    ...step.flags,
    running: step.engine === "idling" || step.engine === "under-load",
    wetExhaust: profile.features.exhaust !== "dry",
    rail: treatedAsRail(profile),
    opensWater: step.flags.opensRawWater === true || step.flags.opensHoseBelowWater === true,
  };
  const inForce = RULES.filter((rule) => rule.holds(facts));
  const text = (part: "first" | "last") => inForce.flatMap((rule) => rule[part]?.(facts) ?? []);
  return { first: text("first"), last: text("last").reverse(), cautions: worstFirst(inForce.flatMap((rule) => rule.caution ?? [])) };
}

/** All that has to be said over a step: what its flags write and what the tree's author cites, worst first, each key once. */
export function cautionsOf(
  step: Step & Pick<Check | Remedy, "cautions">,
  tree: Pick<FaultTree, "cautions">,
  profile: Pick<EngineProfile, "features">,
): StepCaution[] {
  const cited = step.cautions
    .flatMap((key) => tree.cautions.find((caution) => caution.key === key) ?? [])
    .map(({ key, signal, says }) => ({ key, signal, says }));
  const written = safetyOf(step, profile).cautions.filter((caution) => !cited.some(({ key }) => key === caution.key));
  return worstFirst([...written, ...cited]);
}

const SIGNALS: readonly Signal[] = ["danger", "warning", "caution", "notice"];
const worstFirst = (cautions: StepCaution[]): StepCaution[] =>
  cautions.toSorted((a, b) => SIGNALS.indexOf(a.signal) - SIGNALS.indexOf(b.signal));

/** First steps in this order; last steps in the reverse, so that what was shut first is opened last. */
const RULES: readonly Rule[] = [
  {
    holds: (f) => f.inWater,
    first: () =>
      "Into the water only at anchor and in calm: engine stopped, gear in neutral, sails down, the engine key on the swimmer, a helper watching, a floating line out.",
    last: () => "Everyone out of the water and counted before the key goes back.",
    caution: {
      key: "swimmer-at-propeller",
      signal: "danger",
      says: "Never go into the water in a marina or near shore power: leaking current drowns people. Never from a drifting boat. If it is not calm, take a tow or a lift.",
    },
  },
  {
    holds: (f) => f.opensWater,
    first: (f) =>
      `Stop the engine. Shut the ${f.opensRawWater ? "raw-water seacock" : "seacock of the hose you open"}${f.wetExhaust ? ", and the exhaust cock where one is fitted," : ""} and ${f.cranks ? "tie a tag to the start switch: seacock shut" : "hang the engine key on its handle"}.`,
  },
  {
    holds: (f) => f.opensWater,
    last: () => "Look for drips at every joint now, and again after 10 min.",
  },
  {
    holds: (f) => f.opensRawWater,
    last: (f) =>
      `At the start, water must show at the ${f.wetExhaust ? "exhaust" : "outlet"} within 20 s (30 s if the muffler was just drained). None: stop at once.`,
    caution: {
      key: "seacock-left-shut",
      signal: "caution",
      says: "A seacock left shut costs the impeller and the exhaust hose within half a minute of running.",
    },
  },
  {
    holds: (f) => f.opensWater,
    last: (f) =>
      `Open the seacock${f.wetExhaust ? " and the exhaust cock" : ""} just before the next start, not sooner, and count: as many cocks open as before. An engine that may not be started keeps it shut.`,
  },
  {
    holds: (f) => f.opensHoseBelowWater,
    first: () => "Keep a bung of the right size to hand.",
    caution: {
      key: "hose-below-water",
      signal: "danger",
      says: "An open hose below the waterline sinks the boat. Stay with it until it is closed; if the seacock does not hold, do not open the hose.",
    },
  },
  {
    holds: (f) => f.handsAtShaft,
    first: () => "Stop the engine, gear in neutral, key out and in your pocket. Tell everyone aboard that hands are at the shaft.",
  },
  {
    holds: (f) => f.handsAtShaft,
    first: () =>
      "Under sail, in tow or in a stream the propeller turns the shaft all the same: sails down, anchored or moored, and the shaft lashed to the engine bed by a rope thrown round it while it stands. Off again before it is turned by hand, and before the engine is started.",
    last: () => "Lashing off. Spanners, rags and hands away from the shaft before the key goes back.",
    caution: {
      key: "shaft-hands",
      signal: "danger",
      says: "A turning shaft takes hands and sleeves. Never touch shaft, gland or coupling while it turns or could turn.",
    },
  },
  {
    holds: (f) => f.beltsExposed && !f.running,
    first: (f) =>
      f.cranks
        ? "Stop the engine. The key is in your pocket while a hand, a spanner or a lead is near a belt; it goes in only for the crank, with everyone clear, and a second person turns it when you say so."
        : "Stop the engine, key out and in your pocket, before a hand goes near a belt.",
    caution: { key: "belts", signal: "warning", says: "Belts and pulleys take fingers when someone starts the engine." },
  },
  {
    holds: (f) => f.beltsExposed && f.running,
    first: () =>
      "While the engine box is open: moored or in calm, at idle or fast idle only. Tie back hair, hood and cords; a second person stands at the stop control.",
    caution: {
      key: "belts-turning",
      signal: "danger",
      says: "Turning belts and pulleys take hands, hair and sleeves. Do not reach across; take a belt off only with the engine stopped.",
    },
  },
  {
    holds: (f) => f.running && (f.beltsExposed || f.hotParts || f.opensFuelDirty || f.opensFuelClean || f.opensHighPressureFuel),
    caution: {
      key: "exhaust-gas-below",
      signal: "warning",
      says: "An engine run with its space open can fill the cabin with carbon monoxide: alarm on, hatches and canopy open, a second person aboard.",
    },
  },
  {
    holds: (f) => f.hotParts,
    caution: {
      key: "burns",
      signal: "warning",
      says: "Exhaust parts pass 300 °C, and a hot block burns. Measure by infrared, not by hand; work on them only when a bare hand can rest there.",
    },
  },
  {
    holds: (f) => f.opensCoolant,
    first: () =>
      "Rest a bare hand on the header tank and press the hose: take the cap off only when the hand can stay and the hose is soft, often an hour after a run.",
    last: () => "Fill with the engine stopped and put the cap back. After the run let it cool fully before you top up again.",
    caution: {
      key: "hot-coolant",
      signal: "danger",
      says: "Hot coolant under pressure scalds face and hands. No cloth and no half turn makes a hot cap safe. Never taste coolant: glycol is poison.",
    },
  },
  {
    holds: (f) => f.opensFuelDirty || f.opensFuelClean || f.opensHighPressureFuel,
    first: (f) =>
      `${f.running ? "Stop the engine while any fuel part is open" : "Engine stopped"}. Tray and rags under the joint, no flame or hot part near, extinguisher to hand.`,
    last: () => "Wipe dry, then look for weeps with a dry paper, and again after 10 min. Rags and fuel go ashore, not into the bilge.",
    caution: { key: "fuel-spill", signal: "warning", says: "Diesel on a hot part catches fire." },
  },
  {
    holds: (f) => f.opensFuelClean || f.opensHighPressureFuel,
    first: () =>
      "Keep dirt out: wash the outside first, plug each open port, lint-free cloth only, the new element in its bag until it is fitted.",
    last: () => "If dirt got in, flush the line into a jar before it is connected to the pump.",
    caution: {
      key: "clean-side",
      signal: "caution",
      says: "After the last filter nothing catches dirt. Never fill a new element from a can, and use no tape or paste there.",
    },
  },
  {
    holds: (f) => f.rail && (f.opensFuelClean || f.opensHighPressureFuel),
    caution: {
      key: "common-rail-closed",
      signal: "danger",
      says: "Common rail, unit injectors, or not known which: a skipper opens nothing after the last filter, even with the engine stopped. Purge with the electric or hand primer only, then crank; no start in two bursts: stop.",
    },
  },
  {
    holds: (f) => f.opensHighPressureFuel,
    first: () => "Gear in neutral, eye shield on, card and rag over the union. One union at a time, half a turn, two spanners.",
    last: () => "All unions tight before the engine runs on.",
    caution: {
      key: "injection-jet",
      signal: "danger",
      says: "Injection pressure drives fuel through skin and gloves. Look for leaks with a card, never a hand. A struck hand, even a pinhole without pain: to hospital at once, and tell them high-pressure fuel.",
    },
  },
  {
    holds: (f) => f.worksOnBattery,
    first: () =>
      "Stop charger and engine first, open the locker and let it air. Rings and watch off, eye shield on. If a lead comes off: negative first, and see first what goes dead with it; a bilge pump without current pumps nothing.",
    last: () =>
      "Leads clean and tight, the negative on last. Then what the battery feeds: a bilge pump back on automatic, and tried, before anyone leaves the boat.",
    caution: {
      key: "battery-gas",
      signal: "danger",
      says: "Battery gas explodes at a spark. Leave a swollen, hissing, leaking or frozen battery alone: stop the charge at its source and air the space. Never join a lithium bank to a lead battery.",
    },
  },
  {
    holds: (f) => f.underLoad,
    first: () => "Moored: doubled lines, two thirds throttle, 10 s at most. Full throttle only under way in clear water.",
    caution: {
      key: "load-on-lines",
      signal: "warning",
      says: "Full throttle against the lines tears out cleats, and reads short besides.",
    },
  },
  {
    holds: (f) => f.cranks && f.fuelOff,
    first: () =>
      "Hold the stop on at the lever on the pump, or pull the lead or fuse of a solenoid that needs current to run, so that the engine cannot fire. Do not hold a stop button down: its coil burns in seconds.",
    last: () => "Stop control back to run.",
  },
  {
    holds: (f) => f.cranks && f.fuelOff && f.wetExhaust && !f.opensWater,
    first: () => "Shut the raw-water seacock and tie a tag to the start switch: seacock shut.",
    last: () => "Open the seacock and take the tag off before any attempt to run.",
  },
  {
    holds: (f) => f.cranks,
    first: (f) => `Gear seen in neutral, everyone clear of belts and propeller. ${burst(f)}`,
    caution: {
      key: "hydraulic-lock",
      signal: "warning",
      says: "One heavy clunk, or part of a turn and a stop: let go and do not press again. Water in a cylinder bends the engine's rods.",
    },
  },
  {
    holds: (f) => f.cranks,
    caution: {
      key: "starter-runs-on",
      signal: "warning",
      says: "If the starter runs on when the key is let go: stop control, then the start battery's switch off at once, even with the engine running. A starter that stays in burns.",
    },
  },
  {
    holds: (f) => f.cranks && f.wetExhaust,
    caution: {
      key: "cranking-floods",
      signal: "warning",
      says: "Cranking without a start pumps sea water into the muffler and back to the cylinders. After 30 s in all since the engine last ran: shut the seacock and drain the muffler.",
    },
  },
];

/** How long the starter may turn: a wet exhaust sets the limit where there is one, the starter's heat where not. */
function burst({ cranks = 0, wetExhaust }: Facts): string {
  const most = wetExhaust ? 10 : 15;
  if (cranks <= most) return `Crank ${cranks} s, then rest the starter 60 s.`;
  return `Crank ${cranks} s in all, in bursts of ${most} s at most with 60 s rest between.`;
}
