import { caseHolds } from "@/lib/core/diagnosis/case-holds";
import { learn } from "@/lib/core/diagnosis/learn";
import { learnBaseRates } from "@/lib/core/diagnosis/learn-base-rates";
import { playCase } from "@/lib/core/diagnosis/play-case";
import { placeOf } from "@/lib/core/diagnosis/prove";
import { findFlaws } from "@/lib/core/tree/soundness";
import type { FaultTree, KnownCase } from "@/lib/core/tree/schema";
import type { Ask, Replayed, Told } from "./protocol";

/** What takes longer than a frame, off the screen's thread: long work is cut into cases, and a newer question lets an older one go. */
const newest = new Map<Ask["ask"], number>();
const tell = (told: Told): void => self.postMessage(told);
const breath = (): Promise<void> => new Promise((done) => setTimeout(done));

self.onmessage = ({ data }: MessageEvent<Ask>) => {
  newest.set(data.ask, data.id);
  if (data.ask === "check") void check(data);
  else if (data.ask === "prove") void prove(data);
  else tell({ id: data.id, told: "learned", links: learn(data.tree, data.cases), bases: learnBaseRates(data.tree, data.cases) });
};

async function check({ id, tree }: Extract<Ask, { ask: "check" }>): Promise<void> {
  tell({ id, told: "flaws", flaws: findFlaws(tree) });
  const failing: string[] = [];
  for (const known of tree.knownCases) {
    await breath();
    if (newest.get("check") !== id) return;
    if (!caseHolds(tree, known)) failing.push(known.key);
  }
  tell({ id, told: "failing", failing, cases: tree.knownCases.length });
}

async function prove({ id, before, tree, cases, play }: Extract<Ask, { ask: "prove" }>): Promise<void> {
  for (const known of cases) {
    await breath();
    if (newest.get("prove") !== id) return;
    tell({ id, told: "case", key: known.key, before: replayed(before, known, play), after: replayed(tree, known, play) });
  }
  tell({ id, told: "proved" });
}

const replayed = (tree: FaultTree, known: KnownCase, play: boolean): Replayed => ({
  start: placeOf(tree, known, "start").place,
  butConfirming: placeOf(tree, known, "but-confirming").place,
  all: placeOf(tree, known, "all").place,
  minutes: play ? playCase(tree, known, "mechanic").minutes : null,
});
