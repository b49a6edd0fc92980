import { clsx } from "clsx";
import type { StepShown } from "@/lib/core/diagnosis/view";

/** Numbered, one action each. Steps that keep people or engine safe say so; they are not to be skipped. */
export function StepList({ steps }: { steps: StepShown["steps"] }) {
  return (
    <ol className="grid gap-2">
      {steps.map((step, index) => (
        <li
          key={`${index} ${step.text}`}
          className={clsx("grid grid-cols-[2.1rem_1fr] rounded-r-md", step.safety && "border-l-4 border-buoy bg-buoy-wash py-1 pl-1.5")}
        >
          <span className="dial font-bold text-fill night:text-ink">{index + 1}.</span>
          <span>
            {step.safety && <b className="text-buoy">For safety: </b>}
            {step.text}
          </span>
        </li>
      ))}
    </ol>
  );
}
