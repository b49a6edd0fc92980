import { probabilityOf } from "./cause-row";
import type { Belief } from "./believe";
import type { Evidence } from "./evidence";
import { howSure } from "./how-sure";
import type { Model } from "./model";
import { likeliestPairs } from "./pairs";
import { ofHundred } from "./of-hundred";
import { speaksOf, type Speaks } from "./speaks";
import type { Possible, PossibleCause } from "./view";

/** Causes from this share up are named, so that none named stands at 0 of 100; the rest is folded. */
const NAMED_FROM = 0.01;
const NAMED_MOST = 12;
const NOT_CHECKED_MOST = 4;
/** Two faults are said to be possible from over this share. */
export const TWO_FROM = 0.3;

/** What is still possible, as counts out of 100, with what speaks for and against each. Rules [X1]-[X3], [X8]. */
export function possible(model: Model, evidence: Evidence, belief: Belief): Possible {
  const { shares } = belief;
  const ranked = model.causes
    .map((cause, index) => ({ cause, index, share: shares[index] ?? 0 }))
    .sort((a, b) => b.share - a.share || (a.cause.key < b.cause.key ? -1 : 1));
  const named = ranked.filter(({ share }) => share >= NAMED_FROM).slice(0, NAMED_MOST);
  const folded = ranked.slice(named.length);
  const unknown = shares[model.unknownAt] ?? 0;
  const counts = ofHundred([...named.map(({ share }) => share), folded.reduce((sum, { share }) => sum + share, 0), unknown]);
  const speaks = speaksOf(model, evidence, belief.marginals);
  return {
    causes: named.map(({ index, share }, place) => ({
      ...causeShown(model, evidence, index, speaks(index)),
      share,
      of100: counts[place] ?? 0,
      inAll: Math.round((belief.marginals[index] ?? 0) * 100),
    })),
    others: { count: folded.length, of100: counts[named.length] ?? 0 },
    unknown: { share: unknown, of100: counts[named.length + 1] ?? 0 },
    sure: howSure(belief).says,
    two: twoShown(model, belief),
  };
}

/** "Perhaps two faults", and which: said only when the numbers do, and no more once one of them was put right. Rule [X8]. */
function twoShown(model: Model, { two, pairs, putRight }: Belief): Possible["two"] {
  if (putRight || !(two > TWO_FROM)) return null;
  const [likeliest] = likeliestPairs(pairs, model.causes.length, 0, 1);
  const titled = (index: number): { key: string; title: string } => ({ key: model.causes[index]!.key, title: model.causes[index]!.title });
  return likeliest ? { share: two, of100: Math.round(two * 100), likeliest: [titled(likeliest.a), titled(likeliest.b)] } : null;
}

function causeShown(model: Model, evidence: Evidence, index: number, speaks: Speaks): Omit<PossibleCause, "share" | "of100" | "inAll"> {
  const cause = model.causes[index]!;
  const moved = model.setting.multipliers?.find((one) => one.cause === cause.key);
  const asked = new Set(evidence.findings.map(({ check }) => check));
  const notChecked = model.checks
    .filter((check) => cause.gives[check.key] !== undefined && check.offered && !asked.has(check.key))
    .slice(0, NOT_CHECKED_MOST);
  const behind = Object.entries(cause.broughtOnBy).flatMap(([key, strength]) => {
    const root = model.tree.causes.find((one) => one.key === key);
    return root ? [{ cause: key, title: root.title, share: probabilityOf(strength) }] : [];
  });
  return {
    key: cause.key,
    title: cause.title,
    is: cause.is,
    ofThisEngine: moved ? { times: moved.times, reason: moved.reason } : null,
    speaksFor: speaks.for,
    speaksAgainst: speaks.against,
    notChecked: notChecked.map(({ check }) => ({ check: check.key, title: check.title })),
    behind: behind.sort((a, b) => b.share - a.share || (a.cause < b.cause ? -1 : 1)),
  };
}
