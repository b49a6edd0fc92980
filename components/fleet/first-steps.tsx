import { Check } from "lucide-react";
import { Card } from "@/components/ui/card";
import { LinkButton } from "@/components/ui/link-button";

type Step = { title: string; why: string; done: boolean; href: string; go: string };

/** A newcomer's way from nothing to the first diagnosis; the first step that is not done has the button. */
export function FirstSteps({ steps }: { steps: readonly Step[] }) {
  const next = steps.findIndex((step) => !step.done);
  return (
    <Card aria-labelledby="first-steps" className="max-w-2xl">
      <h2 id="first-steps">Three steps to begin</h2>
      <ol className="mt-2 grid gap-3">
        {steps.map((step, i) => (
          <li key={step.title} className="flex gap-3">
            <span
              aria-hidden
              className="dial mt-0.5 flex size-8 flex-none items-center justify-center rounded-full border-[1.5px] border-edge"
            >
              {step.done ? <Check size={18} /> : i + 1}
            </span>
            <div>
              <p className="font-semibold">
                {step.title}
                {step.done && <span className="font-normal text-ink-2"> (done)</span>}
              </p>
              {!step.done && <p className="text-sm text-ink-2">{step.why}</p>}
              {i === next && (
                <LinkButton tone="strong" className="mt-2" href={step.href} prefetch={false}>
                  {step.go}
                </LinkButton>
              )}
            </div>
          </li>
        ))}
      </ol>
    </Card>
  );
}
