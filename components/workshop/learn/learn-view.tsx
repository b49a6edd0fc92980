"use client";

import { useCallback, useEffect, useMemo, useState } from "react";
import { linkInWords } from "@/components/tree/in-words";
import { Button } from "@/components/ui/button";
import { Table, type Column } from "@/components/ui/table";
import type { Told } from "@/lib/client/workshop/protocol";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { Learned } from "@/lib/core/diagnosis/learn";
import type { LearnedBase } from "@/lib/core/diagnosis/learn-base-rates";
import { putNode } from "@/lib/core/tree/edits/put-node";
import { setLink } from "@/lib/core/tree/edits/set-link";
import type { Cause, FaultTree } from "@/lib/core/tree/schema";
import { BASE_RATES } from "@/lib/core/tree/strength";
import { useLoggedCases } from "../use-logged-cases";
import { useWorker } from "../use-worker";

type Props = { fleetId: string; bench: Workbench; tree: FaultTree };

/** Nearer than this the log and the tree do not disagree. */
const WORTH_SAYING = 0.2;

/** Where this fleet's proved outcomes disagree with the draft, by how much and on how many cases. A person accepts it, never the program. */
export function LearnView({ fleetId, bench, tree }: Props) {
  const logged = useLoggedCases(fleetId);
  const [learned, setLearned] = useState<{ links: readonly Learned[]; bases: readonly LearnedBase[] } | null>(null);
  const hear = useCallback((told: Told) => {
    if (told.told === "learned") setLearned(told);
  }, []);
  const ask = useWorker(hear);
  const cases = useMemo(() => (logged && "cases" in logged ? logged.cases.map(({ known }) => known) : null), [logged]);
  useEffect(() => {
    if (cases) ask({ ask: "learn", tree, cases });
  }, [cases, tree, ask]);
  if (logged && "failed" in logged) return <p>{logged.failed}</p>;
  if (!cases || !learned) return <p role="status">Comparing with the log…</p>;
  const links = learned.links.filter(({ chance }) => chance < WORTH_SAYING);
  const bases = learned.bases.filter(({ chance }) => chance < WORTH_SAYING);
  return (
    <div className="grid content-start gap-6">
      <div>
        <h2>What the log says</h2>
        <p className="text-ink-2">
          {cases.length === 1 ? "One diagnosis of this fleet has" : `${cases.length} diagnoses of this fleet have`} ended in a proved cure.
          A word of judgement is worth ten cases, one with a source thirty; the log is counted on top. Few cases prove little: look at the
          count before you accept.
        </p>
      </div>
      <Table
        caption="How common a cause is"
        columns={baseColumns(bench, tree)}
        rows={bases}
        rowKey={({ cause }) => cause}
        empty={<p>The log finds each cause about as often as the draft expects.</p>}
      />
      <Table
        caption="How often a cause gives a finding"
        columns={linkColumns(bench, tree)}
        rows={links}
        rowKey={({ cause, check, finding }) => `${cause}/${check}/${finding}`}
        empty={<p>Nothing in the log disagrees with a link; a cause and check are compared from three cases on.</p>}
      />
    </div>
  );
}

const titleOf = (list: readonly { key: string; title: string }[], key: string): string => list.find((one) => one.key === key)?.title ?? key;
const oneIn = (chance: number): string => (chance < 0.001 ? "under 1 in 1000" : `1 in ${Math.max(1, Math.round(1 / chance))}`);

function baseColumns(bench: Workbench, tree: FaultTree): Column<LearnedBase>[] {
  const accept = ({ cause: key, factor }: LearnedBase) => {
    const now = bench.session.get().tree;
    const cause = now.causes.find((one) => one.key === key);
    if (cause)
      bench.edit(
        putNode(now, "causes", { ...cause, base: Math.min(100, round(weightOf(cause) * factor)) }),
        `${cause.title}: as common as the log says`,
      );
  };
  return [
    { key: "cause", title: "Cause", cell: ({ cause }) => titleOf(tree.causes, cause) },
    { key: "times", title: "Found", figure: true, cell: ({ times }) => times },
    { key: "expected", title: "Expected", figure: true, cell: ({ expected }) => round(expected) },
    { key: "chance", title: "By chance", cell: ({ chance }) => oneIn(chance) },
    {
      key: "accept",
      title: "Weight",
      cell: (line) => {
        const cause = tree.causes.find(({ key }) => key === line.cause);
        return cause ? (
          <Button onClick={() => accept(line)}>{`${round(weightOf(cause))} → ${round(weightOf(cause) * line.factor)}`}</Button>
        ) : null;
      },
    },
  ];
}

function linkColumns(bench: Workbench, tree: FaultTree): Column<Learned>[] {
  const accept = ({ cause, check, finding, withLog }: Learned) =>
    bench.edit(
      setLink(bench.session.get().tree, cause, { gives: check, finding }, round(Math.min(0.99, Math.max(0.01, withLog)))),
      "A strength as the log says",
    );
  return [
    { key: "cause", title: "Cause", cell: ({ cause }) => titleOf(tree.causes, cause) },
    {
      key: "finding",
      title: "Finding",
      cell: ({ check, finding }) => {
        const of = tree.checks.find(({ key }) => key === check);
        return `${of?.title ?? check}: ${titleOf(of?.findings ?? [], finding)}`;
      },
    },
    {
      key: "link",
      title: "The draft says",
      cell: ({ link, tree: share }) => `${link === null ? "no link" : linkInWords(link)} (${Math.round(100 * share)} of 100)`,
    },
    { key: "times", title: "The log", figure: true, cell: ({ times, cases }) => `${times} of ${cases}` },
    { key: "chance", title: "By chance", cell: ({ chance }) => oneIn(chance) },
    {
      key: "accept",
      title: "Share",
      cell: (line) => <Button onClick={() => accept(line)}>{`${round(line.tree)} → ${round(line.withLog)}`}</Button>,
    },
  ];
}

const weightOf = ({ base }: Cause): number => (typeof base === "number" ? base : BASE_RATES[base]);
const round = (value: number): number => Math.round(value * 100) / 100;
