"use client";

import { useEffect } from "react";
import type { ScreenName } from "@/lib/client/screen/use-address";
import { ChangeAnswer } from "./change-answer";
import { Ended } from "./ended";
import { HandOver } from "./hand-over";
import { useHere } from "./here";
import { Looked } from "./looked";
import { OutcomeScreen } from "./outcome-screen";
import { Rules } from "./rules";
import { RulesInForceFolded } from "./rules-in-force";
import { SaidScreen } from "./said-screen";
import { Step } from "./step";
import { SymptomsTold } from "./symptoms-told";
import { Tried } from "./tried";

/** The screen that the address names; where the log says otherwise, the one that is due. */
export function Screen() {
  const { address, view, go, thinking } = useHere();
  const { at } = address;
  const due = dueScreen(at, view.outcome !== null, view.rulesToAsk.length > 0, thinking);
  useEffect(() => {
    if (due) go(due, undefined, "replace");
  }, [due, go]);
  const shown = due ?? at;
  return (
    <>
      {!SAYS_RULES_ITSELF.has(shown) && <RulesInForceFolded />}
      <ScreenNamed at={shown} />
    </>
  );
}

const SAYS_RULES_ITSELF: ReadonlySet<ScreenName> = new Set(["engines", "say", "rules", "step", "more", "hand-over"]);

function ScreenNamed({ at }: { at: ScreenName }) {
  switch (at) {
    case "rules":
      return <Rules />;
    case "said":
      return <SaidScreen />;
    case "change":
    case "answered":
      return <ChangeAnswer />;
    case "looked":
      return <Looked />;
    case "tried":
      return <Tried />;
    case "symptoms":
      return <SymptomsTold />;
    case "outcome":
      return <OutcomeScreen />;
    case "hand-over":
      return <HandOver />;
    case "ended":
      return <Ended />;
    default:
      return <Step />;
  }
}

/** While the next step is worked out the view is of the past: nobody is sent anywhere by it. */
function dueScreen(at: ScreenName, ended: boolean, rulesToAsk: boolean, thinking: boolean): ScreenName | null {
  if (thinking) return null;
  if (ended) return at === "step" || at === "rules" || at === "outcome" ? "ended" : null;
  if (at === "ended") return "step";
  return at === "step" && rulesToAsk ? "rules" : null;
}
