"use client";

import { useRef, useState } from "react";
import { inWords } from "@/lib/client/count-in-words";
import type { RuleAnswered } from "@/lib/core/diagnosis/view";
import { useGuard } from "@/lib/client/screen/use-guard";
import { Button } from "@/components/ui/button";
import { Fold } from "@/components/ui/fold";
import { BackLink } from "./back-link";
import { Defers } from "./defers";
import { useHere } from "./here";
import { RuleCard } from "./rule-card";
import { RulesFound } from "./rules-found";
import { ScreenHeading } from "./screen-heading";

/**
 * The stop rules: those that are due before anything else, then what was
 * answered before, changeable. Danger may turn up at any time, so the rest of
 * them is a tap away, and in the open when nothing is due.
 */
export function Rules() {
  const { view, record, go, thinking, address, setUndo } = useHere();
  const [answers, setAnswers] = useState<Readonly<Record<string, "yes" | "no">>>({});
  const [asked, setAsked] = useState<ReadonlySet<string>>(() => new Set(view.rulesToAsk.map(({ key }) => key)));
  /** A card stays where it is while it is answered. */
  const [atFirst] = useState(() => new Map(view.rules.map((rule) => [rule.key, rule.answer])));
  const written = useRef<Record<string, Promise<{ id: string }>>>({});
  const guard = useGuard();
  const added = view.rulesToAsk.filter(({ key }) => !asked.has(key));
  if (added.length > 0) setAsked(new Set([...asked, ...added.map(({ key }) => key)]));

  const stands = (rule: RuleAnswered) => answers[rule.key] ?? rule.answer;
  const answer = async (rule: RuleAnswered, said: "yes" | "no") => {
    setAnswers((all) => ({ ...all, [rule.key]: said }));
    // A quick change of mind replaces the first answer, even while that is still being written.
    const before = written.current[rule.key];
    const writing = (async () =>
      record("rule-answered", { rule: rule.key, answer: said }, (await before)?.id ?? rule.event ?? undefined))();
    written.current[rule.key] = writing;
    await writing;
  };
  const first = (rule: RuleAnswered) => (rule.key === address.which ? 0 : 1);
  const due = view.rules.filter(({ key }) => asked.has(key));
  const open = due.filter((rule) => stands(rule) === null);
  const others = view.rules.filter(({ key, found }) => !asked.has(key) && !found);
  const before = others.filter(({ key }) => (atFirst.get(key) ?? null) !== null).sort((a, b) => first(a) - first(b));
  const rest = others.filter(({ key }) => (atFirst.get(key) ?? null) === null);
  const noneOfTheRest = async () => {
    for (const rule of open) await answer(rule, "no");
    if (open.length > 0)
      setUndo({ says: `${open.length === 1 ? "One danger" : `${capital(inWords(open.length))} dangers`}: answered no`, look: "rules" });
    go("step");
  };
  const cards = (rules: readonly RuleAnswered[]) => (
    <div className="grid gap-3">
      {rules.map((rule) => (
        <RuleCard key={rule.key} rule={rule} answer={stands(rule)} onAnswer={(said) => void answer(rule, said)} />
      ))}
    </div>
  );
  return (
    <div>
      {open.length === 0 && <BackLink />}
      <ScreenHeading of="rules">Anything dangerous?</ScreenHeading>
      <p className="mt-2 mb-4 text-ink-2">These come before anything else. Each yes says what to do now.</p>
      <RulesFound />
      {cards(due)}
      {before.length > 0 && (
        <section aria-labelledby="answered-before">
          <h2 id="answered-before" className="mt-6 mb-2">
            Answered before
          </h2>
          <p className="mb-3 text-sm text-ink-2">Tap the other answer where it has changed.</p>
          {cards(before)}
        </section>
      )}
      {rest.length > 0 && (
        <Fold title={`Other dangers (${rest.length})`} open={due.length === 0} className="mt-4">
          {cards(rest)}
        </Fold>
      )}
      {view.rules.length === 0 && <p>This fault tree has no stop rule for this engine.</p>}
      <div className="mt-5 grid gap-3">
        <Button tone="plain" size="large" wide onClick={() => go("hand-over")}>
          Call for help: the hand-over page
        </Button>
        <Button
          tone="strong"
          size="large"
          wide
          aria-disabled={thinking && open.length === 0}
          onClick={() => guard("rules go on", () => void noneOfTheRest())}
        >
          {noneOf(open.length, due.length)}
        </Button>
      </div>
      <Defers />
    </div>
  );
}

/** What the one button answers with "no", by number: nobody should say more than they have read. */
function noneOf(open: number, due: number): string {
  if (open === 0) return "Go on";
  if (open === 1) return due === 1 ? "No: go on" : "Not the other one: go on";
  return open === due ? `None of these ${inWords(open)}: go on` : `None of the other ${inWords(open)}: go on`;
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
