"use client";

import type { Said } from "@/lib/core/diagnosis/view";
import { Fold } from "@/components/ui/fold";
import { Notice } from "@/components/ui/notice";
import { BackLink } from "./back-link";
import { Conflicts } from "./conflicts";
import { useHere } from "./here";
import { SaidRow } from "./said-row";
import { ScreenHeading } from "./screen-heading";

/** All that was said, oldest first. Each can be changed or taken back without losing the rest. */
export function SaidScreen() {
  const { view, events } = useHere();
  const refused = events.filter(({ rejected }) => rejected !== undefined);
  // The dangers that are none would bury what was found.
  const [noDanger, answers] = [view.said.filter(isNoDanger), view.said.filter((said) => !isNoDanger(said))];
  return (
    <>
      <BackLink />
      <ScreenHeading of="said">Answers given</ScreenHeading>
      <p className="mt-1 text-ink-2">Change one, or take it back: the others stay as they are.</p>
      <Conflicts />
      {refused.length > 0 && (
        <div className="mt-3">
          <Notice
            tone="bad"
            title={refused.length === 1 ? "The server would not take one entry" : `The server would not take ${refused.length} entries`}
          >
            {[...new Set(refused.map(({ rejected }) => rejected))].join(" ")} They stay on this phone.
          </Notice>
        </div>
      )}
      {view.said.length === 0 && <p className="mt-4">Nothing yet.</p>}
      <ol className="mt-4 grid gap-3">
        {answers.map((said) => (
          <SaidRow key={said.event} said={said} />
        ))}
      </ol>
      {noDanger.length > 0 && (
        <Fold title={`Dangers answered no (${noDanger.length})`} className="mt-3">
          <ol className="grid gap-3">
            {noDanger.map((said) => (
              <SaidRow key={said.event} said={said} />
            ))}
          </ol>
        </Fold>
      )}
    </>
  );
}

const isNoDanger = ({ kind, says }: Said): boolean => kind === "rule-answered" && says === "No";
