import { believe } from "@/lib/core/diagnosis/believe";
import { candidatesOf } from "@/lib/core/diagnosis/candidates";
import { AT_REST, NO_EVIDENCE } from "@/lib/core/diagnosis/evidence";
import { ExpectedCost } from "@/lib/core/diagnosis/expected-cost";
import { Gates } from "@/lib/core/diagnosis/gates";
import { optionsOf } from "@/lib/core/diagnosis/options";
import { PlanAhead } from "@/lib/core/diagnosis/plan-ahead";
import { PlanChecks } from "@/lib/core/diagnosis/plan-checks";
import { madeModel } from "../../support/made-model";
import { modelOf } from "../../support/plain-model";
import { atMost, type Figure } from "./figures";

const CAUSES = 30;
const CHECKS = 24;
const BELIEFS = 40;
const CALLS = 400;
const TURNS = 5;
/** A number that escapes now and then is no allocation a belief: one object would be 16 bytes and more each time. */
const BYTES_MOST = 1;

/** Bytes of heap that the planner's inner loop takes for each belief it follows. */
export function heapFigure(seed: number): Figure {
  const model = modelOf(madeModel(CAUSES, CHECKS, seed));
  const { shares } = believe(model, NO_EVIDENCE);
  const gates = new Gates(model, NO_EVIDENCE, AT_REST, shares);
  const every = Array.from(shares, (_, index) => index);
  const cost = new ExpectedCost(optionsOf(model, gates, AT_REST), model, every);
  const plan = new PlanAhead(new PlanChecks(candidatesOf(model, NO_EVIDENCE, gates, shares), every), cost, shares, BELIEFS);
  const act = { kind: "check", place: 0 } as const;
  let least = Infinity;
  for (let turn = 0; turn <= TURNS; turn++) {
    const before = process.memoryUsage().heapUsed;
    for (let call = 0; call < CALLS; call++) plan.worthOf(act, BELIEFS);
    const taken = process.memoryUsage().heapUsed - before;
    // A collection in between would count backwards; the first turn warms.
    if (turn > 0 && taken >= 0) least = Math.min(least, taken);
  }
  return atMost(
    "nextStep.heapBytesPerBelief",
    least / (CALLS * BELIEFS),
    BYTES_MOST,
    `${CALLS} plans of ${BELIEFS} beliefs, the least of ${TURNS} turns`,
  );
}
