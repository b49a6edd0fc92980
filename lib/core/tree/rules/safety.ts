import type { EngineState, FaultTree } from "../schema";
import type { SafetyFlags } from "../safety-flags";
import { stepNode, stepsOf, type Found, type Rule, type StepNode } from "./rule";

type Contradiction = { holds: (flags: SafetyFlags, engine: EngineState) => boolean; says: string; mend: string };

const running = (engine: EngineState): boolean => engine === "idling" || engine === "under-load";
const turning = (engine: EngineState): boolean => running(engine) || engine === "cranking";

/** Flags that cannot be true of an engine in that state. */
const CONTRADICTIONS: readonly Contradiction[] = [
  {
    holds: (f, engine) => f.cranks !== undefined && engine === "stopped",
    says: "it cranks an engine that it says is stopped.",
    mend: 'Set "engine: cranking", or take "cranks" out.',
  },
  {
    holds: (f, engine) => f.cranks === undefined && engine === "cranking",
    says: "it cranks, but does not say for how long; every second counts towards a flooded exhaust.",
    mend: 'Add "cranks" with the seconds it asks for.',
  },
  {
    holds: (f) => f.fuelOff === true && f.cranks === undefined,
    says: "the stop is held, but nothing cranks.",
    mend: 'Add "cranks", or take "fuelOff" out.',
  },
  {
    holds: (f, engine) => f.fuelOff === true && running(engine),
    says: "the stop is held, so the engine cannot run.",
    mend: 'Set "engine: cranking", or take "fuelOff" out.',
  },
  {
    holds: (f, engine) => f.underLoad === true && engine !== "under-load",
    says: "it is flagged as under load, and its engine state is another.",
    mend: 'Set "engine: under-load", or take the flag out.',
  },
  {
    holds: (f, engine) => f.underLoad !== true && engine === "under-load",
    says: "it runs under load without the flag that says how to moor.",
    mend: 'Add "underLoad: true" under "flags".',
  },
  {
    holds: (f, engine) => f.handsAtShaft === true && turning(engine),
    says: "hands are at a shaft that turns.",
    mend: 'Set "engine: stopped", and run it in a step of its own.',
  },
  {
    holds: (f, engine) => f.inWater === true && turning(engine),
    says: "someone is in the water with the engine turning.",
    mend: 'Set "engine: stopped".',
  },
  {
    holds: (f, engine) => f.opensCoolant === true && (engine === "under-load" || engine === "cranking"),
    says: "the coolant is opened on an engine at work.",
    mend: 'Set "engine: cold".',
  },
  {
    holds: (f, engine) => f.opensHoseBelowWater === true && running(engine),
    says: "a hose below the waterline is open while the engine runs.",
    mend: 'Set "engine: stopped".',
  },
];

const contradictions = (tree: FaultTree): Found[] =>
  stepsOf(tree).flatMap((node) =>
    CONTRADICTIONS.filter(({ holds }) => holds(node.step.flags, node.step.engine)).map(({ says, mend }) => ({
      node: stepNode(node),
      says,
      mend,
    })),
  );

const forSkippers = ({ step }: StepNode): boolean => step.who === "skipper-at-sea" || step.who === "skipper-in-port";

/** Work that no flag's safety steps make fit for a skipper. */
function tooDangerousForSkippers(tree: FaultTree): Found[] {
  return stepsOf(tree)
    .filter(forSkippers)
    .flatMap((node) => {
      const { flags, engine } = node.step;
      const at = stepNode(node);
      if (flags.opensHighPressureFuel)
        return [
          { node: at, says: "it opens high-pressure fuel, and a skipper may do it.", mend: 'Set "who: mechanic" or "who: workshop".' },
        ];
      if (flags.beltsExposed && engine === "under-load")
        return [{ node: at, says: "it puts a skipper beside open belts under load.", mend: 'Do it at idle, or set "who: mechanic".' }];
      return [];
    });
}

/** Injection whose unions a mechanic may slacken aboard. */
const OPENABLE = ["in-line-pump", "rotary-pump"];

function unionsOnARail(tree: FaultTree): Found[] {
  if (!tree.features.some(({ key }) => key === "injection")) return [];
  return stepsOf(tree)
    .filter(({ step }) => step.flags.opensHighPressureFuel && step.who !== "workshop")
    .filter(({ step }) => !(step.appliesTo?.features?.injection ?? ["any"]).every((option) => OPENABLE.includes(option)))
    .map((node) => ({
      node: stepNode(node),
      says: "it opens high-pressure fuel on engines that may be common rail or have unit injectors.",
      mend: `Add "appliesTo: { features: { injection: [${OPENABLE.join(", ")}] } }", or set "who: workshop".`,
    }));
}

/** A harm that is priced but not flagged would come without its safety steps. */
function harmWithoutFlag(tree: FaultTree): Found[] {
  return stepsOf(tree).flatMap((node) => {
    const { harm, flags } = node.step;
    const missing = {
      none: null,
      "opens-suction": flags.opensFuelDirty || flags.opensFuelClean ? null : "opensFuelDirty",
      "opens-injection": flags.opensFuelClean || flags.opensHighPressureFuel ? null : "opensFuelClean or opensHighPressureFuel",
      "opens-hose-below-water": flags.opensHoseBelowWater || flags.opensRawWater ? null : "opensHoseBelowWater or opensRawWater",
    }[harm];
    return missing === null
      ? []
      : [{ node: stepNode(node), says: `its harm is "${harm}", and no flag says so.`, mend: `Add "${missing}: true" under "flags".` }];
  });
}

/** Words in a step that call for a flag it does not have. */
const TELL_TALES: readonly { word: RegExp; flag: keyof SafetyFlags; has: (flags: SafetyFlags) => boolean }[] = [
  { word: /\bcrank (it |the engine )?(for|\d)|\bpress(ing)? (the )?start\b/i, flag: "cranks", has: (f) => f.cranks !== undefined },
  {
    word: /\b(slacken|loosen|crack open|undo)\b.*\b(injector|injection|union)/i,
    flag: "opensHighPressureFuel",
    has: (f) => f.opensHighPressureFuel === true || f.opensFuelDirty === true || f.opensFuelClean === true,
  },
  {
    word: /\b(cap off|open the (header|pressure) cap|take off the (header|pressure) cap)\b/i,
    flag: "opensCoolant",
    has: (f) => f.opensCoolant === true,
  },
];

const flagsForgotten = (tree: FaultTree): Found[] =>
  stepsOf(tree).flatMap((node) =>
    TELL_TALES.filter(
      ({ word, has }) =>
        !has(node.step.flags) && node.step.steps.some((text) => word.test(text) && !/\b(never|do not|don['\u2019]t|without)\b/i.test(text)),
    ).map(({ flag }) => ({
      node: stepNode(node),
      says: `its steps read as if it needs the flag "${flag}".`,
      mend: "Add the flag, or say it in other words.",
    })),
  );

/** What the flags write, written by hand again: said twice it is read less. */
const saidTwice = (tree: FaultTree): Found[] =>
  stepsOf(tree).flatMap((node) => {
    const { flags, steps } = node.step;
    const again =
      flags.opensRawWater === true &&
      [steps[0], steps.at(-1)].some((text) => /\b(shut|close|open|reopen)\b.{0,20}\bseacock\b/i.test(text ?? ""));
    return again
      ? [
          {
            node: stepNode(node),
            says: "its steps shut or open the seacock, which the flag writes already.",
            mend: "Take it out of the steps.",
          },
        ]
      : [];
  });

export const safetyRules: readonly Rule[] = [
  { name: "state-against-flags", severity: "error", find: contradictions },
  { name: "hazard-without-who", severity: "error", find: tooDangerousForSkippers },
  { name: "union-on-a-rail", severity: "error", find: unionsOnARail },
  { name: "harm-without-flag", severity: "error", find: harmWithoutFlag },
  { name: "flag-forgotten", severity: "look-at", find: flagsForgotten },
  { name: "safety-said-twice", severity: "look-at", find: saidTwice },
];
