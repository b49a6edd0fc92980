"use client";

import { useEffect, useState } from "react";
import type { PhoneStore } from "../store/phone-store";
import type { Summary } from "../store/summary";
import { useObservable } from "./use-observable";

/** All diagnoses on the phone, the newest first; empty while they are read. */
export function useSummaries(store: PhoneStore): readonly Summary[] {
  const changes = useObservable(store.changes);
  const [summaries, setSummaries] = useState<readonly Summary[]>([]);
  useEffect(() => {
    let current = true;
    void store.summaries().then((all) => current && setSummaries(all));
    return () => {
      current = false;
    };
  }, [store, changes]);
  return summaries;
}
