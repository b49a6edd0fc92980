import { exactRegrets, type ExactTask } from "./exact-regrets";
import { madeRuns, type MadeTask } from "./made-runs";
import type { Runs } from "./runs";
import { shippedRuns, type ShippedTask } from "./shipped-runs";
import { twoFaultRuns, type TwoFaultRun, type TwoFaultTask } from "./two-fault-runs";

export type Task = MadeTask | ShippedTask | ExactTask | TwoFaultTask;
export type Done = { runs: Runs } | { regrets: number[] } | { twoFaults: TwoFaultRun[] };

async function work(task: Task): Promise<Done> {
  switch (task.kind) {
    case "made":
      return { runs: madeRuns(task) };
    case "shipped":
      return { runs: await shippedRuns(task) };
    case "exact":
      return { regrets: exactRegrets(task) };
    case "two-faults":
      return { twoFaults: await twoFaultRuns(task) };
  }
}

process.on("message", (task: Task) => void work(task).then((done) => process.send!(done)));
