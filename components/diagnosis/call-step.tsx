"use client";

import type { StepShown } from "@/lib/core/diagnosis/view";
import { Button } from "@/components/ui/button";
import { useHere } from "./here";
import { ScreenHeading } from "./screen-heading";

/** Calling for help is a step like any other, and no defeat: it is offered when it costs less than going on. */
export function CallStep({ step }: { step: StepShown | null }) {
  const { go } = useHere();
  return (
    <>
      {step?.why && <p className="mb-3.5 border-l-4 border-fill pl-2.5 text-sm text-ink-2">{step.why}</p>}
      <ScreenHeading of="call">{step?.title ?? "Time to call for help"}</ScreenHeading>
      <p className="mt-2">
        {step
          ? "The hand-over page says everything that was found, so that nobody has to start again."
          : "There is no check or repair left that can be done here. The hand-over page says everything that was found, so that nobody has to start again."}
      </p>
      {step && step.steps.length > 0 && (
        <ol className="mt-3 list-decimal pl-6">
          {step.steps.map(({ text }) => (
            <li key={text}>{text}</li>
          ))}
        </ol>
      )}
      <div className="mt-4 grid gap-3">
        <Button tone="strong" size="large" wide onClick={() => go("hand-over")}>
          The hand-over page
        </Button>
        {step?.goOn && (
          <Button size="large" wide onClick={() => go("step", step.goOn?.key)}>
            {step.goOn.kind === "check" ? "Go on looking" : "Go on trying"}: {step.goOn.title}
          </Button>
        )}
        <Button size="large" wide onClick={() => go("outcome")}>
          End it and log the outcome
        </Button>
      </div>
    </>
  );
}
