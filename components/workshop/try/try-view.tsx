"use client";

import { useEffect, useMemo, useState } from "react";
import { Button } from "@/components/ui/button";
import { CautionPanel } from "@/components/ui/caution-panel";
import { Notice } from "@/components/ui/notice";
import { Segmented } from "@/components/ui/segmented";
import { Reasoner } from "@/lib/client/compute/reasoner";
import { logOf, type Payload } from "@/lib/core/diagnosis/log-of";
import type { DiagnosisView, StepShown } from "@/lib/core/diagnosis/view";
import { Situation, type FaultTree } from "@/lib/core/tree/schema";
import type { Place } from "../place";
import { RuleSays } from "@/components/diagnosis/rule-says";
import { trialBegun } from "./trial";

type Props = { tree: FaultTree; symptom: string; onOpen: (node: Place["node"]) => void };

/** The draft as a skipper would be asked, beside the nodes in play; nothing is logged. */
export function TryView({ tree, symptom, onOpen }: Props) {
  const [situation, setSituation] = useState<Situation>("at-anchor");
  const [said, setSaid] = useState<readonly Payload[]>([]);
  const { shown, failed } = useTrial(tree, symptom, situation, said);
  const say = (payload: Payload) => setSaid((now) => [...now, payload]);
  const title = tree.symptoms.find(({ key }) => key === symptom)?.title ?? symptom;
  return (
    <div className="grid content-start gap-4">
      <div className="flex flex-wrap items-end gap-3">
        <h2 className="mr-auto">Try it: {title}</h2>
        <Button disabled={said.length === 0} onClick={() => setSaid((now) => now.slice(0, -1))}>
          Back
        </Button>
        <Button disabled={said.length === 0} onClick={() => setSaid([])}>
          From the start
        </Button>
      </div>
      <Segmented
        name="trial-situation"
        legend="The boat is"
        value={situation}
        options={Situation.options.map((one) => ({ value: one, title: one.replaceAll("-", " ") }))}
        onChange={setSituation}
      />
      {failed && <Notice tone="bad">{failed}</Notice>}
      {!shown && !failed && <p role="status">Working it out…</p>}
      {shown && (
        <div className="grid gap-4 xl:grid-cols-[minmax(0,1fr)_20rem]">
          <div className="grid content-start gap-4">
            {shown.rulesInForce.map((rule) => (
              <RuleSays key={rule.key} rule={rule} />
            ))}
            <Asked shown={shown} say={say} onOpen={onOpen} />
          </div>
          <StillPossible shown={shown} onOpen={onOpen} />
        </div>
      )}
    </div>
  );
}

function useTrial(tree: FaultTree, symptom: string, situation: Situation, said: readonly Payload[]) {
  const reasoner = useMemo(() => new Reasoner(), []);
  const [shown, setShown] = useState<DiagnosisView | null>(null);
  const [failed, setFailed] = useState<string | null>(null);
  const version = useMemo(() => `trial-${nextTrial++}-${tree.key}`, [tree]);
  // Each edit makes another tree: the worker does not keep them all, nor outlive the view.
  useEffect(() => () => reasoner.close(), [reasoner, version]);
  useEffect(() => {
    let current = true;
    reasoner
      .view(version, tree, logOf([trialBegun(symptom, situation), ...said]))
      .then((view) => {
        if (!current) return;
        setShown(view);
        setFailed(null);
      })
      .catch((failure: unknown) => current && setFailed(failure instanceof Error ? failure.message : "It could not be worked out."));
    return () => {
      current = false;
    };
  }, [reasoner, version, tree, symptom, situation, said]);
  return { shown, failed };
}

let nextTrial = 1;

type AskedProps = { shown: DiagnosisView; say: (payload: Payload) => void; onOpen: Props["onOpen"] };

function Asked({ shown, say, onOpen }: AskedProps) {
  if (shown.rulesToAsk.length > 0)
    return (
      <section className="grid content-start gap-3">
        <h3>Asked before anything else</h3>
        <ul className="list-disc pl-5">
          {shown.rulesToAsk.map((rule) => (
            <li key={rule.key}>{rule.ask}</li>
          ))}
        </ul>
        <div>
          <Button
            tone="strong"
            onClick={() => shown.rulesToAsk.forEach(({ key }) => say({ kind: "rule-answered", payload: { rule: key, answer: "no" } }))}
          >
            None of these
          </Button>
        </div>
      </section>
    );
  if (shown.curedCause)
    return (
      <p>
        Cured: {shown.possible.causes.find(({ key }) => key === shown.curedCause?.cause)?.title ?? shown.curedCause.cause}. Nothing of this
        is logged.
      </p>
    );
  if (!shown.step) return <p>Nothing is left to ask.</p>;
  return <Step step={shown.step} say={say} onOpen={onOpen} />;
}

function Step({ step, say, onOpen }: { step: StepShown; say: (payload: Payload) => void; onOpen: Props["onOpen"] }) {
  const answer = (given: Extract<Payload, { kind: "answered" }>["payload"]["answer"]) =>
    say({ kind: "answered", payload: { check: step.key, answer: given, photos: [] } });
  const tried = (result: "cured" | "better" | "no-change" | "could-not") =>
    say({ kind: "remedy-tried", payload: { remedy: step.key, result, photos: [] } });
  return (
    <section className="grid content-start gap-3">
      <h3>
        {step.kind === "call" ? (
          step.title
        ) : (
          <button
            type="button"
            className="link text-left"
            onClick={() => onOpen({ list: step.kind === "check" ? "checks" : "remedies", key: step.key })}
          >
            {step.title}
          </button>
        )}
      </h3>
      <p className="text-sm text-ink-2">{step.why}</p>
      {step.cautions.map((caution) => (
        <CautionPanel key={caution.key} signal={caution.signal}>
          {caution.says}
        </CautionPanel>
      ))}
      <ol className="list-decimal pl-6">
        {step.steps.map(({ text, safety }, index) => (
          <li key={index} className={safety ? "text-ink-2" : ""}>
            {text}
          </li>
        ))}
      </ol>
      {step.kind === "check" && (
        <div className="grid gap-2">
          <p className="font-semibold">{step.ask}</p>
          {step.answers.map(({ finding, title }) => (
            <Button key={finding} onClick={() => answer({ finding })}>
              {title}
            </Button>
          ))}
          <Button onClick={() => answer({ cannotTell: true })}>Can’t tell, or can’t get to it</Button>
        </div>
      )}
      {step.kind === "remedy" && (
        <div className="grid gap-2">
          <Button onClick={() => tried("cured")}>It cured it</Button>
          <Button onClick={() => tried("better")}>Better, not cured</Button>
          <Button onClick={() => tried("no-change")}>No change</Button>
          <Button onClick={() => tried("could-not")}>Could not do it</Button>
        </div>
      )}
    </section>
  );
}

function StillPossible({ shown, onOpen }: { shown: DiagnosisView; onOpen: Props["onOpen"] }) {
  const { causes, others, unknown } = shown.possible;
  return (
    <section>
      <h3>Of 100 engines like this</h3>
      <ul>
        {causes.map(({ key, title, of100 }) => (
          <li key={key} className="flex items-baseline justify-between gap-3 border-b border-rule">
            <button type="button" className="link min-h-12 text-left" onClick={() => onOpen({ list: "causes", key })}>
              {title}
            </button>
            <span className="dial">{of100}</span>
          </li>
        ))}
        <li className="flex justify-between gap-3 py-2 text-ink-2">
          <span>{others.count} others</span>
          <span className="dial">{others.of100}</span>
        </li>
        <li className="flex justify-between gap-3 py-2 text-ink-2">
          <span>Something not in this tree</span>
          <span className="dial">{unknown.of100}</span>
        </li>
      </ul>
    </section>
  );
}
