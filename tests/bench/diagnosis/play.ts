import { believe } from "@/lib/core/diagnosis/believe";
import type { Evidence } from "@/lib/core/diagnosis/evidence";
import type { Model } from "@/lib/core/diagnosis/model";
import { placeOf } from "../../support/dice";
import type { Luck } from "./luck";

export type Act = { readonly kind: "check" | "remedy" | "call"; readonly key: string };

/** A way of going on: what is done next, given what is known; `spent` minutes so far, as the model has them. */
export type Way = (model: Model, evidence: Evidence, spent: number) => Act;

/** The world that a run is played in. */
export type World = {
  /** What is true; its checks and remedies stand in the order of the model that is planned with. */
  readonly truth: Model;
  /** What a step takes in truth, times what the model says. */
  readonly times: (key: string) => number;
  /** What a call costs in truth, with this evidence. */
  readonly call: (evidence: Evidence, truth: number) => number;
  /** Minutes still owed where this remedy worked. */
  readonly owed: (remedy: string) => number;
  /** So often an answer is another than the one seen, and so often a check is refused. */
  readonly wrong: number;
  readonly refused: number;
};

export type Played = { readonly minutes: number; readonly called: boolean; readonly checks: number; readonly remedies: number };

/** More steps than any run takes. */
const STEPS_MOST = 5000;

/** One run to its end: cured, or called. */
export function play(way: Way, model: Model, begin: Evidence, world: World, luck: Luck): Played {
  let evidence = begin;
  let minutes = 0;
  let spent = 0;
  for (let step = 0; step < STEPS_MOST; step++) {
    const { kind, key } = way(model, evidence, spent);
    const { findings, remedies } = evidence;
    const ended = (called: boolean): Played => ({ minutes, called, checks: findings.length, remedies: remedies.length });
    if (kind === "call") {
      minutes += world.call(evidence, luck.truth);
      return ended(true);
    }
    if (kind === "check") {
      const at = model.checkAt.get(key)!;
      spent += model.checks[at]!.minutes;
      minutes += model.checks[at]!.minutes * world.times(key);
      evidence = { ...evidence, findings: [...findings, { check: key, finding: answer(model, world, luck, at) }] };
      continue;
    }
    const at = model.remedyAt.get(key)!;
    spent += model.remedies[at]!.minutes;
    minutes += model.remedies[at]!.minutes * world.times(key);
    if (luck.remedies[at]! < world.truth.remedies[at]!.cure[luck.truth]!) {
      minutes += world.owed(key);
      return ended(false);
    }
    evidence = { ...evidence, remedies: [...remedies, { remedy: key, result: "no-change" }] };
  }
  throw new Error("a run did not end");
}

function answer(model: Model, world: World, luck: Luck, at: number): string | null {
  if (luck.refused[at]! < world.refused) return null;
  const check = world.truth.checks[at]!;
  const seen = placeOf(
    check.rows.map((row) => row[luck.truth]!),
    luck.checks[at]!,
  );
  const count = check.rows.length;
  // Wrong: any of the others, as the rest of the roll falls.
  const told = luck.wrong[at]! < world.wrong ? (seen + 1 + Math.floor((luck.wrong[at]! / world.wrong) * (count - 1))) % count : seen;
  return model.checks[at]!.check.findings[told]!.key;
}

/** The world as the model says it is, and a call costs its price. */
export const worldOf = (model: Model, over: Partial<World> = {}): World => ({
  truth: model,
  times: () => 1,
  call: () => model.callMinutes,
  owed: () => 0,
  wrong: 0,
  refused: 0,
  ...over,
});

/** Shares of the hypotheses before anything is known but the symptoms. */
export const sharesAtFirst = (model: Model, begin: Evidence): Float64Array => believe(model, begin).shares;
