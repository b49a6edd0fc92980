import { nextStep } from "@/lib/core/diagnosis/next-step";
import { leastMinutes } from "../../reference/oracle";
import { plannedMinutes } from "../../reference/planned-minutes";
import { seedAt } from "../../support/dice";
import { madeModel } from "../../support/made-model";
import { modelOf } from "../../support/plain-model";

const CAUSES = 7;
const CHECKS = 5;

export type ExactTask = { readonly kind: "exact"; readonly from: number; readonly to: number; readonly seed: number };

/** By how much the planner's whole plan costs more than the best there is, as a share of it: a number a model. */
export function exactRegrets({ from, to, seed }: ExactTask): number[] {
  return Array.from({ length: to - from }, (_, place) => {
    const model = modelOf(madeModel(CAUSES, CHECKS, seedAt(seed, from + place)));
    const least = leastMinutes(model);
    return (plannedMinutes(model, nextStep) - least) / least;
  });
}
