import { COSTS, standingMinutes } from "./costs";
import type { Standing } from "./evidence";
import type { Gates } from "./gates";
import type { Model, RemedyModel } from "./model";

/** A remedy as it could be tried now. */
export type Option = {
  /** The remedy's index in the model. */
  readonly at: number;
  readonly remedy: RemedyModel;
  /** With its try-out and what has to be done before it. */
  readonly minutes: number;
  /** Minutes still owed where it works. */
  readonly held: number;
  /** Chance that it is fitted, and that the way to it opens. */
  readonly comesOff: number;
};

/** Remedies that could be tried, now or once their gates are passed, in the order of their keys. Rules [G1]-[G4], [T7], [C6]. */
export function optionsOf(model: Model, gates: Gates, standing: Standing): readonly Option[] {
  const options: Option[] = [];
  model.remedies.forEach((remedy, at) => {
    if (remedy.linkedAt.length === 0 || gates.isDone({ kind: "remedy", key: remedy.key }) || !gates.isFeasible(remedy)) return;
    if (standing.mayNotStart && remedy.remedy.tryOut.minutes > 0) return;
    const gate = gates.gateOf(remedy);
    if (!gate.open && gate.shut) return;
    options.push({
      at,
      remedy,
      minutes: remedy.minutes + standingMinutes(remedy.remedy, standing) + (gate.open ? 0 : gate.minutes),
      held: remedy.remedy.temporary ? COSTS.heldOnly[model.setting.situation] : 0,
      comesOff: remedy.share * (gate.open ? 1 : gate.pass),
    });
  });
  return options.sort((a, b) => (a.remedy.key < b.remedy.key ? -1 : 1));
}
