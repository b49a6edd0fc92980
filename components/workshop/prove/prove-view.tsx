"use client";

import { useCallback, useEffect, useMemo, useState } from "react";
import { Button } from "@/components/ui/button";
import { Segmented } from "@/components/ui/segmented";
import type { Replayed, Told } from "@/lib/client/workshop/protocol";
import { verdictOf, type Verdict } from "@/lib/client/workshop/verdict";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { putNode } from "@/lib/core/tree/edits/put-node";
import type { FaultTree, KnownCase } from "@/lib/core/tree/schema";
import type { Place } from "../place";
import { useLoggedCases } from "../use-logged-cases";
import { useVersion } from "../use-version";
import { useWorker } from "../use-worker";
import { CaseTable } from "./case-table";
import { inSum } from "./in-sum";

type Props = { fleetId: string; bench: Workbench; tree: FaultTree; currentId: string; onOpen: (node: Place["node"]) => void };
type Which = "known" | "logged";

export type Line = { known: KnownCase; before: Replayed; after: Replayed; verdict: Verdict };

/** The known cases, and the fleet's own logged ones, replayed through the version in use and through the draft. */
export function ProveView({ fleetId, bench, tree, currentId, onOpen }: Props) {
  const before = useVersion(fleetId, currentId);
  const logged = useLoggedCases(fleetId);
  const [which, setWhich] = useState<Which>("known");
  const [play, setPlay] = useState(false);
  const [results, setResults] = useState<ReadonlyMap<string, { before: Replayed; after: Replayed }>>(new Map());
  const [done, setDone] = useState(false);
  const cases = useMemo(
    () => (which === "known" ? tree.knownCases : logged && "cases" in logged ? logged.cases.map(({ known }) => known) : []),
    [which, tree, logged],
  );
  const hear = useCallback((told: Told) => {
    if (told.told === "case") setResults((now) => new Map(now).set(told.key, told));
    if (told.told === "proved") setDone(true);
  }, []);
  const ask = useWorker(hear);
  useEffect(() => {
    if (!before) return;
    const timer = setTimeout(() => {
      setDone(false);
      ask({ ask: "prove", before, tree, cases, play });
    }, 300);
    return () => clearTimeout(timer);
  }, [before, tree, cases, play, ask]);
  const lines = cases.flatMap((known): Line[] => {
    const result = results.get(known.key);
    return result ? [{ known, ...result, verdict: verdictOf(result.before, result.after) }] : [];
  });
  return (
    <div className="grid content-start gap-4">
      <h2>Prove it</h2>
      <div className="flex flex-wrap items-end gap-4">
        <Segmented
          name="which-cases"
          legend="Cases"
          value={which}
          options={[
            { value: "known", title: `Known cases (${tree.knownCases.length})` },
            { value: "logged", title: `This fleet’s log (${logged && "cases" in logged ? logged.cases.length : "…"})` },
          ]}
          onChange={setWhich}
        />
        <Button aria-pressed={play} onClick={() => setPlay(!play)}>
          {play ? "Without the minutes" : "Play them through, for the minutes"}
        </Button>
      </div>
      {which === "logged" && logged && "failed" in logged && <p>{logged.failed}</p>}
      {which === "logged" && logged && "cases" in logged && logged.cases.length === 0 && (
        <p>No diagnosis of this fleet has ended in a proved cure yet. When one does, the draft can be replayed against it here.</p>
      )}
      <p role="status">{inSum(lines, cases.length, done)}</p>
      <CaseTable
        lines={lines}
        play={play}
        onOpen={which === "known" ? (key) => onOpen({ list: "knownCases", key }) : null}
        onKeep={
          which === "logged"
            ? (known) => bench.edit(putNode(bench.session.get().tree, "knownCases", known), "A logged diagnosis became a known case")
            : null
        }
        isKept={(key) => tree.knownCases.some((known) => known.key === key)}
      />
    </div>
  );
}
