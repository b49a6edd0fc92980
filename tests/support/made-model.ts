import { dice, type Dice } from "./dice";
import type { PlainModel } from "./plain-model";

/** Prior of what no remedy cures. */
const UNKNOWN = 0.05;
const CALL_MINUTES = 400;
/** Spread of the logarithm of a weight, of a check's minutes and of a remedy's. */
const SPREAD = { weight: 1.1, minutes: 0.5 };

/**
 * A made-up diagnosis of any size, for benches: causes in about sqrt(n) systems
 * with log-normal weights; half of the checks ask about a system, three in ten
 * about one cause and cost more, two in ten about a random third; four in ten
 * sometimes cannot be told. A remedy a cause, of which a quarter now and then
 * cure another as well.
 */
export function madeModel(causes: number, checks: number, seed: number): PlainModel {
  const rolls = dice(seed);
  const systems = Math.max(2, Math.round(Math.sqrt(causes)));
  const systemOf = indices(causes).map(() => rolls.below(systems));
  const weights = indices(causes).map(() => rolls.logNormal(1, SPREAD.weight));
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const shares = weights.map((weight) => weight / total);
  return {
    prior: [...shares.map((share) => share * (1 - UNKNOWN)), UNKNOWN],
    checks: indices(checks).map(() => madeCheck(rolls, systemOf, shares)),
    remedies: indices(causes).map((own) => madeRemedy(rolls, own, causes)),
    callMinutes: CALL_MINUTES,
  };
}

const indices = (count: number): number[] => Array.from({ length: count }, (_, index) => index);

function madeCheck(rolls: Dice, systemOf: readonly number[], shares: readonly number[]): PlainModel["checks"][number] {
  const causes = systemOf.length;
  const kind = rolls.roll();
  const target = rolls.below(causes);
  const about = (cause: number): boolean => {
    if (kind < 0.5) return systemOf[cause] === systemOf[target];
    return kind < 0.8 ? cause === target : rolls.roll() < 1 / 3;
  };
  const sensitivity = rolls.between(0.75, 0.98);
  const specificity = rolls.between(0.8, 0.99);
  const cannotTell = rolls.roll() < 0.4 ? rolls.between(0, 0.2) : 0;
  const yes = new Float64Array(causes + 1);
  let mean = 0;
  for (let cause = 0; cause < causes; cause++) {
    const share = (about(cause) ? sensitivity : 1 - specificity) + rolls.between(-0.05, 0.05);
    yes[cause] = Math.min(0.995, Math.max(0.005, share));
    mean += shares[cause]! * yes[cause]!;
  }
  // Of the unknown no more is known than the causes' mean, and a little of even odds.
  yes[causes] = 0.7 * mean + 0.3 * 0.5;
  const told = 1 - cannotTell;
  const rows = [yes.map((share) => share * told), yes.map((share) => (1 - share) * told)];
  return {
    minutes: rolls.logNormal(kind >= 0.5 && kind < 0.8 ? 12 : 4.5, SPREAD.minutes),
    rows: cannotTell > 0 ? [...rows, yes.map(() => cannotTell)] : rows,
  };
}

function madeRemedy(rolls: Dice, own: number, causes: number): PlainModel["remedies"][number] {
  const minutes = rolls.logNormal(25, SPREAD.minutes);
  const cures: [number, number][] = [[own, rolls.between(0.85, 1)]];
  const other = rolls.below(causes);
  const chance = rolls.between(0.5, 1);
  if (rolls.roll() < 0.25 && other !== own) cures.push([other, chance]);
  return { minutes, cures };
}
