import type { DiagnosisEvent } from "../contract/event";
import type { FaultTree } from "../tree/schema";
import { askedNext, type AskedNext } from "./asked-next";
import { compile } from "./compile";
import { evidenceOf } from "./evidence-of";
import { fold } from "./fold";
import { hangsOn } from "./hangs-on";
import type { Compile } from "./keep-models";
import { nextStep } from "./next-step";
import { settingOf } from "./setting-of";

/** So many of the words that the ranking hangs on are said. */
const SAID_MOST = 3;

/** What would come next on each answer to the step that is due, and which of the tree's words the ranking hangs on. */
export type WhatIf = { readonly next: readonly AskedNext[]; readonly hangsOn: readonly string[] };

/**
 * For whoever wants to look behind the step that is due: tens of beliefs and a
 * next step for each answer, so it is worked out when asked for. Rules [X10], [X12].
 */
export function whatIf(tree: FaultTree, log: readonly DiagnosisEvent[], models: Compile = compile): WhatIf {
  const state = fold(log);
  const model = models(tree, settingOf(tree, state));
  const evidence = evidenceOf(tree, state);
  return {
    next: askedNext(tree, log, nextStep(model, evidence), models),
    hangsOn: hangsOn(model, evidence)
      .slice(0, SAID_MOST)
      .map(({ says }) => says),
  };
}
