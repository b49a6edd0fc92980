import { atMost, type Figure } from "./figures";
import { bestOf, mean, ratioOf, type Runs } from "./runs";

export const OTHERS = ["chartOrder", "baseRateOrder", "curePerCost", "informationPerCost", "lookAhead"] as const;
const UPPER_MOST = 1.03;
/** Played so little that a ratio says nothing. */
const FEWEST = 8;

const minutesOf = (runs: Runs, names: readonly string[]): string =>
  names.map((name) => `${name} ${mean(runs.minutes[name]!).toFixed(0)}`).join(", ");

/** What made-up diagnoses of one size cost, beside the other ways. */
export function sizeFigures(size: number, runs: Runs): Figure[] {
  if (runs.group.length < FEWEST) return [];
  const best = bestOf(runs, OTHERS);
  const { ratio, upper } = ratioOf(runs, "planner", best);
  const known = mean(runs.minutes.known!);
  return [
    atMost(`cost.ratioToBestOther.${size}`, ratio, null, `${runs.group.length} runs; best other: ${best}`),
    atMost(`cost.ratioToBestOther.${size}.upper`, upper, UPPER_MOST, minutesOf(runs, ["planner", ...OTHERS, "known"])),
    atMost(`cost.ratioToInformation.${size}`, ratioOf(runs, "planner", "informationPerCost").ratio),
    atMost(
      `cost.wayToKnownCauseGone.${size}`,
      (mean(runs.minutes[best]!) - mean(runs.minutes.planner!)) / (mean(runs.minutes[best]!) - known),
      null,
      "of what the best other costs over the known cause, so much is saved",
    ),
    atMost(
      `calledForHelp.${size}`,
      mean(runs.called.planner!),
      null,
      OTHERS.map((name) => `${name} ${mean(runs.called[name]!).toFixed(2)}`).join(", "),
    ),
  ];
}

/** The same for one scenario beside the plain ones. */
export function scenarioFigures(name: string, runs: Runs, bar: number | null): Figure[] {
  if (runs.group.length < FEWEST) return [];
  const best = bestOf(runs, OTHERS);
  const { ratio, upper } = ratioOf(runs, "planner", best);
  return [
    atMost(`cost.${name}.ratioToBestOther`, ratio, null, `${runs.group.length} runs; best other: ${best}`),
    atMost(`cost.${name}.ratioToBestOther.upper`, upper, bar, minutesOf(runs, ["planner", ...OTHERS, "known"])),
    atMost(`cost.${name}.ratioToBaseRate`, ratioOf(runs, "planner", "baseRateOrder").ratio),
    atMost(
      `calledForHelp.${name}`,
      mean(runs.called.planner!),
      null,
      OTHERS.map((one) => `${one} ${mean(runs.called[one]!).toFixed(2)}`).join(", "),
    ),
  ];
}
