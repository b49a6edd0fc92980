import type { Evidence } from "./evidence";
import { heard, reportedIn } from "./finding-weight";
import type { CheckModel, Model } from "./model";
import type { NextStep } from "./next-step";
import { outcomesOf } from "./outcomes";
import { minutesSaid } from "./words";

/** Below this a cause is too unlikely to be a reason for anything. */
const WORTH_NAMING = 0.02;

/**
 * Why this step, in two short sentences made from the numbers that chose it:
 * what it tells apart, or what put it here; and what it costs. Rule [X4].
 *
 * @param clears titles of the rules in force that the step can lift.
 * @param minutes what the clock will show; null for a call.
 */
export function whyStep(model: Model, evidence: Evidence, step: NextStep, clears: readonly string[], minutes: number | null): string {
  const lead = leadOf(model, evidence, step, clears);
  // That the tree puts a check early is the lesser reason where the numbers have one.
  const why = step.because === "pinned" && !step.gateTo ? tellsOf(model, evidence, step) || lead : lead || tellsOf(model, evidence, step);
  return [why, minutes === null ? "" : costOf(model, step, minutes)].filter((part) => part !== "").join(" ");
}

const quoted = (title: string): string => `\u201c${title}\u201d`;

function titleOf(model: Model, ref: { kind: "check" | "remedy" | "call"; key: string }): string {
  if (ref.kind === "check") return model.checks[model.checkAt.get(ref.key) ?? -1]?.check.title ?? ref.key;
  return model.remedies[model.remedyAt.get(ref.key) ?? -1]?.remedy.title ?? ref.key;
}

function leadOf(model: Model, evidence: Evidence, step: NextStep, clears: readonly string[]): string {
  if (step.gateTo) return `This has to come before ${quoted(titleOf(model, step.gateTo))}.`;
  switch (step.because) {
    case "clears-a-rule":
      return clears.length > 0 ? `Only this shows whether it still holds: ${clears.join("; ")}.` : "A stop rule says so.";
    case "what-changed":
      return "A fault often follows what was touched last, and thinking back costs least.";
    case "pinned": {
      const symptom = evidence.symptoms.find(
        ({ symptom, present }) => present && model.checks[model.checkAt.get(step.key) ?? -1]?.check.firstFor[symptom] !== undefined,
      );
      const title = model.tree.symptoms.find(({ key }) => key === symptom?.symptom)?.title;
      return title === undefined ? "The tree puts this early." : `The tree puts this early for ${quoted(title)}.`;
    }
    case "cheaper-than-trying":
      return "Looking on is still cheaper than trying parts or calling.";
    case "nothing-better":
      if (evidence.standing?.mayNotStart)
        return "While it must not be started no repair can be proved here: first do what lifts the rule, if that can be done.";
      return "Nothing left to look at or to try here is likely to pay for its time.";
    case "likely-cure":
    case "tells-most":
      return "";
  }
}

const of100 = (share: number): string => {
  const count = Math.round(share * 100);
  return count === 0 ? "under 1 of 100" : `${count} of 100`;
};

function tellsOf(model: Model, evidence: Evidence, step: NextStep): string {
  if (step.kind === "call") return "";
  if (step.kind === "remedy") {
    const tried = model.remedies[model.remedyAt.get(step.key) ?? -1];
    const chance = tried?.cure.reduce((sum, one, index) => sum + one * (step.shares[index] ?? 0), 0) ?? 0;
    const would = tried?.remedy.temporary
      ? `It would keep ${of100(chance)} engines like this one going for now`
      : `It would cure ${of100(chance)} engines like this one`;
    return `${would}, and if it does not, that tells something too.`;
  }
  const check = model.checks[model.checkAt.get(step.key) ?? -1];
  return check ? separates(model, evidence, check, step.shares) : "";
}

type Swing = {
  readonly index: number;
  readonly most: { finding: number; share: number };
  readonly least: { finding: number; share: number };
};

/** The cause that the check moves most, and the one that the opposite finding speaks for. */
function separates(model: Model, evidence: Evidence, check: CheckModel, shares: Float64Array): string {
  const swings = swingsOf(model, evidence, check, shares);
  const [first] = swings;
  if (!first || first.most.share - first.least.share < 0.005) return "";
  const shareOf = (swing: Swing): number => shares[swing.index] ?? 0;
  if (Math.max(first.most.share, shareOf(first)) < WORTH_NAMING) return "Little is left to tell apart here; this is the best of it.";
  const rival = swings.find(
    (other) => other.most.finding !== first.most.finding && other.most.share - other.least.share > 0.02 && shareOf(other) >= WORTH_NAMING,
  );
  const cause = (swing: Swing): string => quoted(model.causes[swing.index]?.title ?? "");
  return rival
    ? `It tells ${cause(first)} from ${cause(rival)}: ${of100(shareOf(first))} and ${of100(shareOf(rival))} now.`
    : `It tells most about ${cause(first)}: ${of100(shareOf(first))} now.`;
}

function swingsOf(model: Model, evidence: Evidence, check: CheckModel, shares: Float64Array): readonly Swing[] {
  const sight = check.check.sameSight;
  const seen = sight === undefined ? undefined : heard(model, evidence.findings).find((one) => one.check.check.sameSight === sight);
  const { weigh } = outcomesOf(model, check, reportedIn(evidence), seen);
  const totals = weigh.map((row) => row.reduce((sum, weight, index) => sum + weight * (shares[index] ?? 0), 0));
  const swings = model.causes.map((_, index): Swing => {
    const then = weigh.map((row, finding) => ({ finding, share: ((shares[index] ?? 0) * (row[index] ?? 0)) / (totals[finding] || 1) }));
    const byShare = [...then].sort((a, b) => b.share - a.share);
    const none = { finding: 0, share: 0 };
    return { index, most: byShare[0] ?? none, least: byShare.at(-1) ?? none };
  });
  return swings.sort((a, b) => b.most.share - b.least.share - (a.most.share - a.least.share) || a.index - b.index);
}

function costOf(model: Model, step: NextStep, minutes: number): string {
  const known =
    step.kind === "check"
      ? model.checks[model.checkAt.get(step.key) ?? -1]?.check
      : model.remedies[model.remedyAt.get(step.key) ?? -1]?.remedy;
  if (!known) return "";
  const { flags } = known;
  const opens =
    known.opens ||
    flags.opensRawWater ||
    flags.opensCoolant ||
    flags.opensFuelDirty ||
    flags.opensFuelClean ||
    flags.opensHighPressureFuel ||
    flags.opensHoseBelowWater;
  const takes = minutesSaid(minutes);
  return `${takes.charAt(0).toUpperCase()}${takes.slice(1)}${opens || step.kind === "remedy" ? "" : "; nothing has to be opened"}.`;
}
