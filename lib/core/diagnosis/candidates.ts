import { standingMinutes } from "./costs";
import { AT_REST, type Evidence } from "./evidence";
import { heard, reportedIn, type Heard } from "./finding-weight";
import type { Gates, StepRef } from "./gates";
import type { CheckModel, Model } from "./model";
import { informationOf, outcomesOf, secondLook, type Outcomes } from "./outcomes";

/** Under this, in nats, a check tells nothing worth a minute. */
export const TELLS_NOTHING = 1e-4;
/** Values closer than this are the same; the key decides. */
export const SAME = 1e-9;

/** A check that could be asked now, or once its gates are passed. */
export type Candidate = {
  readonly check: CheckModel;
  /** With what has to be done before it. */
  readonly minutes: number;
  readonly outcomes: Outcomes;
  /** Chance that there is something to look at, and that the way to it opens. */
  readonly learns: number;
  /** What it is expected to tell, in nats. */
  readonly information: number;
  readonly gate: StepRef | null;
};

/** Checks that could be asked, the most telling for their minutes first. Rules [G1], [G2], [N3], [N6], [N9]. */
export function candidatesOf(model: Model, evidence: Evidence, gates: Gates, shares: Float64Array): readonly Candidate[] {
  const standing = evidence.standing ?? AT_REST;
  const reported = reportedIn(evidence);
  const sights = new Map<string, Heard>();
  for (const one of heard(model, evidence.findings))
    if (one.check.check.sameSight !== undefined) sights.set(one.check.check.sameSight, one);
  const canTell = chanceToTell(model, evidence);
  const all: Candidate[] = [];
  for (const check of model.checks) {
    if (!check.linked || gates.isDone({ kind: "check", key: check.key }) || !gates.isFeasible(check)) continue;
    const gate = gates.gateOf(check);
    if (!gate.open && gate.shut) continue;
    const seen = sights.get(check.check.sameSight ?? "");
    const told = outcomesOf(model, check, reported, seen);
    const outcomes = seen ? secondLook(told, shares) : told;
    const learns = canTell * check.share * (gate.open ? 1 : gate.pass);
    const information = informationOf(outcomes, shares) * learns;
    if (information < TELLS_NOTHING) continue;
    const minutes = check.minutes + standingMinutes(check.check, standing) + (gate.open ? 0 : gate.minutes);
    all.push({ check, minutes, outcomes, learns, information, gate: gate.open ? null : gate.first });
  }
  const rate = (one: Candidate): number => one.information / one.minutes;
  return all.sort((a, b) => (Math.abs(rate(a) - rate(b)) > SAME ? rate(b) - rate(a) : a.check.key < b.check.key ? -1 : 1));
}

/** How often this person, here, can tell what is asked: what was told so far moves it (a beta prior's mean). Rule [N10]. */
function chanceToTell(model: Model, evidence: Evidence): number {
  const asked = evidence.findings.filter(({ check }) => model.checkAt.has(check));
  const told = asked.filter(({ finding }) => finding !== null);
  return (model.tells.told + told.length) / (model.tells.asked + asked.length);
}
