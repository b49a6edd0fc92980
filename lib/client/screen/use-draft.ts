"use client";

import { useCallback, useEffect, useState } from "react";
import { emptyDraft, takenUp, type Draft } from "../store/draft";
import type { PhoneStore } from "../store/phone-store";

/** What has been said of an engine so far; every change is kept at once. null while it is read. */
export function useDraft(store: PhoneStore, engineId: string, mechanic: boolean): [Draft | null, (part: Partial<Draft>) => void] {
  const [draft, setDraft] = useState<Draft | null>(null);
  useEffect(() => {
    let current = true;
    void store
      .draft(engineId)
      .then((kept) => current && setDraft(kept ? takenUp(kept, Date.now(), mechanic) : emptyDraft(engineId, mechanic)));
    return () => {
      current = false;
    };
  }, [store, engineId, mechanic]);
  const change = useCallback(
    (part: Partial<Draft>) => {
      if (!draft) return;
      const next = { ...draft, ...part, keptAt: new Date().toISOString() };
      setDraft(next);
      void store.keepDraft(next);
    },
    [store, draft],
  );
  return [draft, change];
}
