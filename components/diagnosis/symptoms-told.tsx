"use client";

import { Button } from "@/components/ui/button";
import { BackLink } from "./back-link";
import { useHere } from "./here";
import { ScreenHeading } from "./screen-heading";
import { YesNo } from "./yes-no";

/** A symptom more or less. "No" is evidence too; one that nobody has spoken of is none. */
export function SymptomsTold() {
  const { tree, view, record, go } = useHere();
  const told = new Map(view.symptoms.map(({ key, present }) => [key, present]));
  return (
    <>
      <BackLink />
      <ScreenHeading of="symptoms">What does it do, and what not?</ScreenHeading>
      <p className="mt-2 text-ink-2">Leave alone what you have not noticed.</p>
      <div className="mt-3 grid gap-3">
        {tree.symptoms.map((symptom) => {
          const present = told.get(symptom.key);
          return (
            <section key={symptom.key} className="rounded-xl border-[1.5px] border-edge bg-sheet p-3.5">
              <h2 className="text-lg">{symptom.title}</h2>
              <p className="mb-2 text-sm text-ink-2">{symptom.detail}</p>
              <YesNo
                label={symptom.title}
                value={present === undefined ? null : present ? "yes" : "no"}
                onAnswer={(answer) => void record("symptom-told", { symptom: symptom.key, present: answer === "yes" })}
              />
            </section>
          );
        })}
      </div>
      <Button tone="strong" size="large" wide className="mt-4" onClick={() => go("step")}>
        Go on
      </Button>
    </>
  );
}
