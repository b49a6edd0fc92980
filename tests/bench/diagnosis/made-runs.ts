import { NO_EVIDENCE } from "@/lib/core/diagnosis/evidence";
import { seedAt } from "../../support/dice";
import { madeModel } from "../../support/made-model";
import { modelOf } from "../../support/plain-model";
import { minutesIfKnown } from "./known-cause";
import { drawLuck } from "./luck";
import { play, worldOf } from "./play";
import type { Runs } from "./runs";
import { WAYS, type WayName } from "./ways";

/** So many runs are played on one made-up model. */
const RUNS_A_MODEL = 4;

export type MadeTask = {
  readonly kind: "made";
  readonly size: number;
  readonly from: number;
  readonly to: number;
  readonly seed: number;
  readonly wrong: number;
  readonly refused: number;
};

/** Every way on the same made-up models with the same luck. As many checks as causes. */
export function madeRuns({ size, from, to, seed, wrong, refused }: MadeTask): Runs {
  const names = Object.keys(WAYS) as WayName[];
  const runs: Runs = { group: [], minutes: { known: [] }, called: {} };
  let group = -1;
  let model = modelOf(madeModel(2, 2, seed));
  for (let run = from; run < to; run++) {
    const own = Math.floor(run / RUNS_A_MODEL);
    if (own !== group) model = modelOf(madeModel(size, size, seedAt(seed + size, own)));
    group = own;
    const luck = drawLuck(seedAt(seed - size, run), model.logPrior.map(Math.exp), model.checks.length, model.remedies.length);
    runs.group.push(group);
    runs.minutes.known!.push(minutesIfKnown(model, luck.truth));
    for (const name of names) {
      const { minutes, called } = play(WAYS[name], model, NO_EVIDENCE, worldOf(model, { wrong, refused }), luck);
      (runs.minutes[name] ??= []).push(minutes);
      (runs.called[name] ??= []).push(called ? 1 : 0);
    }
  }
  return runs;
}
