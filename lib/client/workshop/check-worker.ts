import { caseHolds } from "@/lib/core/diagnosis/case-holds";
import { findFlaws } from "@/lib/core/tree/soundness";
import type { CheckAsk, CheckTold } from "./check-protocol";

/** Soundness first, then the known cases one by one; a newer tree puts an older one's cases aside. */
let newest = 0;
const tell = (told: CheckTold): void => self.postMessage(told);

self.onmessage = async ({ data: { id, tree } }: MessageEvent<CheckAsk>) => {
  newest = id;
  tell({ id, flaws: findFlaws(tree) });
  const failing: string[] = [];
  for (const known of tree.knownCases) {
    // Lets a newer question in.
    await new Promise((done) => setTimeout(done));
    if (newest !== id) return;
    if (!caseHolds(tree, known)) failing.push(known.key);
  }
  tell({ id, failing, cases: tree.knownCases.length });
};
