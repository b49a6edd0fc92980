"use client";

import type { OutcomeKind } from "@/lib/core/contract/event";
import { Button } from "@/components/ui/button";
import { LinkButton } from "@/components/ui/link-button";
import { BeenHereBefore } from "./been-here-before";
import { Defers } from "./defers";
import { useHere } from "./here";
import { ScreenHeading } from "./screen-heading";

const SAYS: Record<OutcomeKind, string> = {
  cured: "Cured, and proved",
  held: "Held for now",
  "handed-over": "Handed over",
  "by-itself": "It runs again by itself",
  "broken-off": "Broken off",
};

/** What was logged, what was used, and the way on. */
export function Ended() {
  const { view, tree, record, go, toEngines, ready, summary } = useHere();
  const { outcome } = view;
  if (!outcome) return <ScreenHeading of="ended">One moment</ScreenHeading>;
  const cause = outcome.cause ? tree.causes.find(({ key }) => key === outcome.cause)?.title : outcome.causeInWords;
  const remedy = outcome.remedy ? tree.remedies.find(({ key }) => key === outcome.remedy)?.title : outcome.remedyInWords;
  const rows: readonly (readonly [string, string | undefined])[] = [
    ["What it was", cause],
    ["What put it right", remedy],
    ["How it was proved", outcome.proof],
    ["Engine hours", outcome.engineHours === undefined ? undefined : `${outcome.engineHours} h`],
    ["Minutes", outcome.minutes === undefined ? undefined : String(outcome.minutes)],
    [
      "Parts used, now missing aboard",
      outcome.parts.map(({ title, quantity }) => (quantity > 1 ? `${quantity} x ${title}` : title)).join(", ") || undefined,
    ],
    ["Note", outcome.note],
  ];
  return (
    <>
      <ScreenHeading of="ended">{SAYS[outcome.outcome]}: it is logged</ScreenHeading>
      {outcome.outcome === "held" && (
        <p className="mt-2">The cause stays open. Put it right, or prove it, before trusting the engine far from help.</p>
      )}
      <dl className="mt-4 grid gap-3">
        {rows.map(
          ([title, says]) =>
            says !== undefined && (
              <div key={title}>
                <dt className="text-sm text-ink-2">{title}</dt>
                <dd className="font-semibold whitespace-pre-wrap">{says}</dd>
              </div>
            ),
        )}
      </dl>
      {outcome.cause && (
        <div className="mt-4">
          <BeenHereBefore cause={outcome.cause} />
        </div>
      )}
      <div className="mt-6 grid gap-3">
        <Button tone="strong" size="large" wide onClick={toEngines}>
          To the engines
        </Button>
        {outcome.outcome === "handed-over" && (
          <Button size="large" wide onClick={() => go("hand-over")}>
            The hand-over page
          </Button>
        )}
        <LinkButton href={`/f/${ready.person.fleetId}/log/${summary.id}`} size="large" wide>
          Step by step in the log
        </LinkButton>
        <Button tone="quiet" wide onClick={() => void record("taken-up-again", {}).then(() => go("step"))}>
          Not over after all: take it up again
        </Button>
      </div>
      <Defers />
    </>
  );
}
