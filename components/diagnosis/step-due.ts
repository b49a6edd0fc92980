import type { StepShown } from "@/lib/core/diagnosis/view";
import { useHere } from "./here";

/** The step on the screen: the one that is due, or what someone does all the same where it says to call. */
export function useStepDue(): StepShown | null {
  const { view, address } = useHere();
  const goOn = view.step?.goOn ?? null;
  return goOn !== null && address.which === goOn.key ? goOn : view.step;
}
