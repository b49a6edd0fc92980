"use client";

import { useCallback, useMemo, useState } from "react";
import type { Reasoner } from "@/lib/client/compute/reasoner";
import type { Ready } from "@/lib/client/screen/surface";
import type { Address, useAddress } from "@/lib/client/screen/use-address";
import { useDiagnosis } from "@/lib/client/screen/use-diagnosis";
import type { Phone } from "@/lib/core/contract/phone";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { DiagnosisFrame } from "./diagnosis-frame";
import { Frame } from "./frame";
import { HereContext, type Here } from "./here";
import { Screen } from "./screen";

type Props = {
  id: string;
  ready: Ready;
  reasoner: Reasoner;
  phone: Phone;
  address: Address;
  go: ReturnType<typeof useAddress>["go"];
};

/** One diagnosis: reads it from the store and hands it to its screens. */
export function OpenDiagnosis({ id, ready, reasoner, phone, address, go }: Props) {
  const state = useDiagnosis(ready, reasoner, id);
  const [undo, setUndo] = useState<Here["undo"]>(null);
  const goHere = useCallback<Here["go"]>((at, which, how) => go({ d: id, at, which: which ?? null }, how), [go, id]);
  const goOnFrom = useCallback<Here["goOnFrom"]>(
    (event) => {
      go({ d: id, at: "answered", which: event }, "replace");
      go({ d: id, at: "step" });
    },
    [go, id],
  );
  const toEngines = useCallback(() => go({ at: "engines" }), [go]);
  const { summary, tree, view } = state;
  const { events } = state;
  const whatIf = useCallback<Here["whatIf"]>(() => {
    if (!summary || !tree) return Promise.reject(new Error("there is no diagnosis to look into"));
    const log = events.map(({ event }) => event);
    return reasoner.whatIf(summary.treeVersionId, tree, log);
    // The summary is made anew each time from the events.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [reasoner, tree, events]);
  const engine = phone.engines.find((one) => one.id === summary?.engineId);
  const here = useMemo<Here | null>(
    () =>
      engine && tree && view && summary
        ? {
            ready,
            phone,
            engine,
            tree,
            view,
            summary,
            events: state.events,
            thinking: state.thinking,
            address,
            go: goHere,
            goOnFrom,
            toEngines,
            record: state.record,
            whatIf,
            undo,
            setUndo,
          }
        : null,
    [
      ready,
      phone,
      engine,
      tree,
      view,
      summary,
      state.events,
      state.thinking,
      address,
      goHere,
      goOnFrom,
      toEngines,
      state.record,
      whatIf,
      undo,
    ],
  );
  if (here)
    return (
      <HereContext.Provider value={here}>
        <DiagnosisFrame>
          {state.failure && (
            <div className="mb-4">
              <Failed why={state.failure} onAgain={state.again} />
            </div>
          )}
          <Screen />
        </DiagnosisFrame>
      </HereContext.Provider>
    );
  return (
    <Frame ready={ready} who={phone.fleet.name}>
      {state.missing ? (
        <div className="grid gap-4">
          <Notice tone="look" title="This diagnosis is not on this phone">
            It was begun on another phone, or belongs to another fleet. With a signal it is fetched from the server.
          </Notice>
          <Button tone="strong" onClick={toEngines}>
            To the engines
          </Button>
        </div>
      ) : state.failure ? (
        <Failed why={state.failure} onAgain={state.again} />
      ) : summary && !engine ? (
        <Notice tone="look" title="The engine of this diagnosis is not in this fleet any more">
          The answers are kept on this phone.
        </Notice>
      ) : tree === null ? (
        <Notice tone="look" title="The fault tree of this diagnosis is not on this phone">
          It comes with the next signal; the answers are kept.
        </Notice>
      ) : (
        <p role="status">Opening the diagnosis.</p>
      )}
    </Frame>
  );
}

/** A way on from a failure: the answers are safe, and it may well work the next time. */
function Failed({ why, onAgain }: { why: string; onAgain: () => void }) {
  return (
    <Notice tone="bad" title="The next step could not be worked out" live>
      <p>Your answers are kept. What went wrong: {why}</p>
      <Button className="mt-2" onClick={onAgain}>
        Try again
      </Button>
    </Notice>
  );
}
