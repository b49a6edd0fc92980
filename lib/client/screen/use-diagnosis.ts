"use client";

import { useCallback, useEffect, useRef, useState } from "react";
import type { DiagnosisEvent, EventKind, EventOf } from "@/lib/core/contract/event";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Reasoner } from "../compute/reasoner";
import { takeInFromServer } from "../exchange/pull";
import type { KeptEvent } from "../store/database";
import { summarize, type Summary } from "../store/summary";
import type { Ready } from "./surface";
import { useObservable } from "./use-observable";
import { useTree } from "./use-phone";

export type Recorder = <K extends EventKind>(kind: K, payload: EventOf<K>["payload"], supersedes?: string) => Promise<DiagnosisEvent>;

export type DiagnosisState = {
  events: readonly KeptEvent[];
  summary: Summary | null;
  tree: FaultTree | null | undefined;
  /** The newest view; it stays while the next is worked out. */
  view: DiagnosisView | null;
  /** True from a tap until the screen that follows from it. */
  thinking: boolean;
  /** Nothing of this diagnosis is on the phone, nor was to be had from the server. */
  missing: boolean;
  failure: string | null;
  /** Works the step out once more after a failure. */
  again: () => void;
  record: Recorder;
};

/** One diagnosis from the phone's store: its events, and what the core makes of them. */
export function useDiagnosis(ready: Ready, reasoner: Reasoner, diagnosisId: string): DiagnosisState {
  const { store, exchange, person } = ready;
  const changes = useObservable(store.changes);
  const [events, setEvents] = useState<readonly KeptEvent[] | null>(null);
  const [missing, setMissing] = useState(false);
  const [seen, setSeen] = useState<{ view: DiagnosisView; of: string } | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const [lastRecorded, setLastRecorded] = useState<string | null>(null);
  const [attempt, setAttempt] = useState(0);
  const asked = useRef(false);

  useEffect(() => {
    let current = true;
    void store.events(diagnosisId).then(async (kept) => {
      if (!current) return;
      setEvents(kept);
      if (kept.length > 0 || asked.current) return;
      asked.current = true;
      await takeInFromServer(store, person.fleetId, diagnosisId).catch(() => undefined);
      const found = await store.events(diagnosisId);
      if (current && found.length === 0) setMissing(true);
    });
    return () => {
      current = false;
    };
  }, [store, diagnosisId, changes, person.fleetId]);

  const summary = events ? summarize(events.map(({ event }) => event)) : null;
  const tree = useTree(store, summary?.treeVersionId ?? null);
  const fingerprint = events?.map(({ event }) => event.id).join() ?? "";
  const version = summary?.treeVersionId ?? null;

  useEffect(() => {
    if (!events || !tree || !version) return;
    let current = true;
    reasoner
      .view(
        version,
        tree,
        events.map(({ event }) => event),
      )
      .then(
        (view) => {
          if (!current) return;
          setFailure(null);
          setSeen({ view, of: fingerprint });
        },
        (why: unknown) => current && setFailure(why instanceof Error ? why.message : String(why)),
      );
    return () => {
      current = false;
    };
    // The fingerprint stands for the events: a settled receipt is no reason to think again.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [reasoner, tree, version, fingerprint, attempt]);

  const again = useCallback(() => {
    setFailure(null);
    setAttempt((before) => before + 1);
  }, []);

  const record = useCallback<Recorder>(
    async (kind, payload, supersedes) => {
      const event = await store.record(diagnosisId, kind, payload, supersedes);
      setLastRecorded(event.id);
      exchange.nudge();
      return event;
    },
    [store, exchange, diagnosisId],
  );

  // From the tap on, not only from when the store has told of it: a screen drawn in between would be of the past.
  const thinking = failure === null && (seen?.of !== fingerprint || (lastRecorded !== null && !fingerprint.includes(lastRecorded)));

  return {
    events: events ?? [],
    summary,
    tree,
    view: seen?.view ?? null,
    thinking,
    missing: missing && (events?.length ?? 0) === 0,
    failure,
    again,
    record,
  };
}
