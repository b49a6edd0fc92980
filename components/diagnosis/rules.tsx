"use client";

import { useRef, useState } from "react";
import type { RuleShown } from "@/lib/core/diagnosis/view";
import { useGuard } from "@/lib/client/screen/use-guard";
import { Button } from "@/components/ui/button";
import { Defers } from "./defers";
import { useHere } from "./here";
import { RuleCard } from "./rule-card";
import { RuleSays } from "./rule-says";
import { ScreenHeading } from "./screen-heading";

/** The stop rules that fit, all at once and before anything else. What has been answered stays on the screen and can be changed. */
export function Rules() {
  const { view, record, go, thinking } = useHere();
  const [shown, setShown] = useState<readonly RuleShown[]>(view.rulesToAsk);
  const [answers, setAnswers] = useState<Readonly<Record<string, "yes" | "no">>>({});
  const written = useRef<Record<string, Promise<{ id: string }>>>({});
  const guard = useGuard();
  const added = view.rulesToAsk.filter((rule) => !shown.some(({ key }) => key === rule.key));
  if (added.length > 0) setShown([...shown, ...added]);

  const answer = async (rule: string, said: "yes" | "no") => {
    // A quick change of mind replaces the first answer, even while that is still being written.
    const before = written.current[rule];
    const writing = (async () => record("rule-answered", { rule, answer: said }, (await before)?.id))();
    written.current[rule] = writing;
    await writing;
    setAnswers((all) => ({ ...all, [rule]: said }));
  };
  const open = shown.filter(({ key }) => !answers[key]);
  const noneOfTheRest = async () => {
    for (const { key } of open) await answer(key, "no");
    go("step");
  };
  /** Answered before this screen was opened again: what they say is not forgotten by a reload. */
  const before = view.rulesInForce.filter(({ key }) => !shown.some((rule) => rule.key === key));
  const inForce = shown.filter(({ key }) => answers[key] === "yes");
  return (
    <div>
      <ScreenHeading of="rules">Anything dangerous?</ScreenHeading>
      <p className="mt-2 text-ink-2">These come before anything else. Each yes says what to do now.</p>
      {before.map((rule) => (
        <RuleSays key={rule.key} rule={rule} />
      ))}
      <div className="mt-4 grid gap-3">
        {shown.map((rule) => (
          <RuleCard key={rule.key} rule={rule} answer={answers[rule.key] ?? null} onAnswer={(said) => void answer(rule.key, said)} />
        ))}
        {shown.length === 0 && <p>No stop rule fits what has been said.</p>}
      </div>
      <div className="mt-5 grid gap-3">
        {inForce.length + before.length > 0 && (
          <Button tone="plain" size="large" wide onClick={() => go("hand-over")}>
            Call for help: the hand-over page
          </Button>
        )}
        <Button
          tone="strong"
          size="large"
          wide
          aria-disabled={thinking && open.length === 0}
          onClick={() => guard("rules go on", () => void noneOfTheRest())}
        >
          {open.length === shown.length && shown.length > 0
            ? "None of these: go on"
            : open.length > 0
              ? "None of the others: go on"
              : "Go on"}
        </Button>
      </div>
      <Defers />
    </div>
  );
}
