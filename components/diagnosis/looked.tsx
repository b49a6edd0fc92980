"use client";

import { checkShown } from "@/lib/client/check-shown";
import { AnswerForm } from "./answer-form";
import { BackLink } from "./back-link";
import { Defers } from "./defers";
import { useHere } from "./here";
import { MissingFigure } from "./missing-figure";
import { NodePicker } from "./node-picker";
import { ScreenHeading } from "./screen-heading";

/** A check made before it was asked for. It counts as if it had been. */
export function Looked() {
  const { tree, view, address, go, record, setUndo, events } = useHere();
  const check = tree.checks.find(({ key }) => key === address.which);
  if (!check)
    return (
      <>
        <BackLink />
        <ScreenHeading of="looked">What have you looked at?</ScreenHeading>
        <div className="mt-3">
          <NodePicker id="find-check" label="Find it by a word" tree={tree} nodes={tree.checks} onPick={(key) => go("looked", key)} />
        </div>
      </>
    );
  const shown = checkShown(tree, check, view.profile);
  const before = view.said.find(({ kind, key }) => kind === "answered" && key === check.key);
  const standing = events.find(({ event }) => event.id === before?.event);
  return (
    <>
      <BackLink />
      <ScreenHeading of={check.key}>{check.title}</ScreenHeading>
      {before && <p className="mt-2 text-sm text-ink-2">Answered before: {before.says}. A new answer takes its place.</p>}
      <MissingFigure checkKey={check.key} />
      <AnswerForm
        of={check.key}
        ask={check.ask}
        answers={shown.answers}
        reading={shown.reading}
        ifFitted={false}
        onAnswer={async ({ answer, says, note, photos }) => {
          const event = await record(
            "answered",
            { check: check.key, answer, ...(note ? { note } : {}), photos: [...photos] },
            standing?.event.id,
          );
          setUndo({ event: event.id, says: `${check.title}: ${says}`, withdraws: null });
          go("step");
        }}
      />
      <Defers />
    </>
  );
}
