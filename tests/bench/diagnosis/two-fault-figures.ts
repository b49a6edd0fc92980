import { atMost, type Figure } from "./figures";
import { mean } from "./runs";
import type { TwoFaultRun } from "./two-fault-runs";

/** Engines with two faults: how they end, what it costs beside the planner that knows of one only, and what is said. */
export function twoFaultFigures(runs: readonly TwoFaultRun[]): Figure[] {
  const of = (faults: 1 | 2): readonly TwoFaultRun[] => runs.filter((run) => run.faults === faults);
  const [one, two] = [of(1), of(2)];
  if (one.length === 0 || two.length === 0) return [];
  const share = (all: readonly TwoFaultRun[], is: (run: TwoFaultRun) => boolean): number => mean(all.map((run) => (is(run) ? 1 : 0)));
  const minutes = (all: readonly TwoFaultRun[], by: "one" | "two"): number => mean(all.map((run) => run.minutes[by]));
  return [
    atMost(
      "twoFaults.bothCured",
      share(two, ({ cured }) => cured.two),
      null,
      `${two.length} engines with two faults; else help was called`,
    ),
    atMost(
      "twoFaults.bothCured.bySingleFaultPlanner",
      share(two, ({ cured }) => cured.one),
    ),
    atMost(
      "twoFaults.costToSingleFaultPlanner",
      minutes(two, "two") / minutes(two, "one"),
      null,
      `${minutes(two, "two").toFixed(0)} and ${minutes(two, "one").toFixed(0)} min`,
    ),
    atMost(
      "twoFaults.costToSingleFaultPlanner.oneFault",
      minutes(one, "two") / minutes(one, "one"),
      null,
      `${one.length} engines with one fault`,
    ),
    atMost(
      "twoFaults.saidRightly",
      share(two, ({ said }) => said),
      null,
      '"perhaps two faults", of engines with two',
    ),
    atMost(
      "twoFaults.saidWrongly",
      share(one, ({ said }) => said),
      null,
      "of engines with one",
    ),
  ];
}
