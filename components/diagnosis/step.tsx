"use client";

import { useWakeLock } from "@/lib/client/screen/use-wake-lock";
import { CallStep } from "./call-step";
import { CheckStep } from "./check-step";
import { ConflictNotice } from "./conflict-notice";
import { CuredStep } from "./cured-step";
import { Defers } from "./defers";
import { useHere } from "./here";
import { OutOfTurn } from "./out-of-turn";
import { RemedyStep } from "./remedy-step";
import { ReturnNotice } from "./return-notice";
import { RulesInForce } from "./rules-in-force";
import { ScreenHeading } from "./screen-heading";
import { useStepDue } from "./step-due";
import { UndoBar } from "./undo-bar";

/** What to do now: one step, and nothing else to decide. */
export function Step() {
  const { view, thinking } = useHere();
  useWakeLock(true);
  const step = useStepDue();
  return (
    <div aria-busy={thinking}>
      <UndoBar />
      <ReturnNotice />
      <ConflictNotice />
      <RulesInForce />
      {step === null && thinking && (
        <>
          <ScreenHeading of="thinking">One moment</ScreenHeading>
          <p>The next step is being worked out. Your answers are kept.</p>
        </>
      )}
      {step?.kind === "check" && <CheckStep key={step.key} step={step} />}
      {step?.kind === "remedy" && <RemedyStep key={step.key} step={step} />}
      {step === null && !thinking && view.curedCause !== null && <CuredStep />}
      {((step === null && !thinking && view.curedCause === null) || step?.kind === "call") && <CallStep step={step} />}
      <OutOfTurn />
      <Defers />
    </div>
  );
}
