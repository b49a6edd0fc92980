"use client";

import { checkShown } from "@/lib/client/check-shown";
import type { Check, Remedy } from "@/lib/core/tree/schema";
import { BackLink } from "./back-link";
import { CheckAnswers } from "./check-answers";
import { Defers } from "./defers";
import { useHere } from "./here";
import { RemedyResults } from "./remedy-results";
import { ScreenHeading } from "./screen-heading";

/** A check or a repair that is told without being asked for: for the first time, or in the place of what was said before. */
export function Told({ node }: { node: { check: Check } | { remedy: Remedy } }) {
  const { view, tree, events, thinking } = useHere();
  const { key, title } = "check" in node ? node.check : node.remedy;
  const said = view.said.find((one) => (one.kind === "answered" || one.kind === "remedy-tried") && one.key === key);
  const before = events.find(({ event }) => event.id === said?.event)?.event;
  return (
    <>
      <BackLink />
      <ScreenHeading of={key}>{title}</ScreenHeading>
      {said && <p className="mt-2 text-ink-2">Said before: {said.says}. What you say now takes its place.</p>}
      {thinking ? (
        <p role="status" className="mt-3">
          One moment.
        </p>
      ) : "check" in node ? (
        <CheckAnswers
          key={key}
          asked={checkShown(tree, node.check, view.profile)}
          before={before?.kind === "answered" ? before : undefined}
        />
      ) : (
        <RemedyResults key={key} remedy={node.remedy} before={before?.kind === "remedy-tried" ? before : undefined} />
      )}
      <Defers />
    </>
  );
}
