import type { Check, EngineState, Remedy, Situation } from "../tree/schema";

/** What steps cost, in minutes. One table, shown to whoever asks. Rules [C1]-[C7]. */
export const COSTS = {
  /** Times the work. */
  access: { easy: 1, moderate: 1.3, hard: 1.8 },
  mess: { none: 0, some: 5, much: 15 },
  harm: { none: 0, "opens-suction": 10, "opens-injection": 30, "opens-hose-below-water": 30 },
  hotToCold: 60,
  start: 2,
  /** A tool or part that has to be fetched; at sea it cannot be. */
  fetchAlongside: 240,
  /** A try-out that cannot be had where the boat lies. */
  tryOutElsewhere: 30,
  /** What is still owed after a temporary remedy. */
  heldOnly: { alongside: 120, "at-anchor": 60, "under-way": 60 },
  call: { alongside: 240, "at-anchor": 480, "under-way": 720 },
  /**
   * What whoever is called still needs to find the cause, for each nat that is open: they have the same looks to make. A judgement;
   * SPEC.md [C7] says what it was held against.
   */
  helperFinds: 150,
} as const;

/** Work, access, mess and harm, and a remedy's try-out: what does not depend on what was done before. */
export function fixedMinutes(step: Check | Remedy, situation: Situation): number {
  const work = step.minutes * COSTS.access[step.access] + COSTS.mess[step.mess] + COSTS.harm[step.harm];
  if (!("tryOut" in step)) return work;
  const elsewhere = step.tryOut.situations !== undefined && !step.tryOut.situations.includes(situation);
  return work + step.tryOut.minutes + (elsewhere ? COSTS.tryOutElsewhere : 0);
}

/** How the engine stands when the next step begins. */
export type EngineStanding = { readonly hot: boolean; readonly running: boolean; readonly open: ReadonlySet<string> };

/** What the step costs on top because of how the engine stands: waiting, a start, something to be opened first. */
export function standingMinutes(step: Pick<Check | Remedy, "engine" | "opens">, engine: EngineStanding): number {
  const opening = step.opens && !engine.open.has(step.opens.area) ? step.opens.minutes : 0;
  return opening + waitingMinutes(step.engine, engine);
}

function waitingMinutes(needs: EngineState, engine: EngineStanding): number {
  if (needs === "cold") return engine.hot ? COSTS.hotToCold : 0;
  if (needs === "idling" || needs === "under-load") return engine.running ? 0 : COSTS.start;
  return 0;
}

/** What the clock will show: work, waiting, opening and try-out, without the price of mess and harm. */
export function clockMinutes(step: Check | Remedy, engine: EngineStanding): number {
  return step.minutes * COSTS.access[step.access] + ("tryOut" in step ? step.tryOut.minutes : 0) + standingMinutes(step, engine);
}
