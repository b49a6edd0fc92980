"use client";

import { useCallback, useState } from "react";

/** When something began, as a Date.now() figure, kept over reloads and screens: the starter goes on resting meanwhile. null: it has not. */
export function useKeptMoment(key: string): [number | null, (moment: number | null) => void] {
  const [moment, setMoment] = useState<number | null>(() => {
    try {
      const kept = Number(localStorage.getItem(key) ?? NaN);
      return Number.isFinite(kept) ? kept : null;
    } catch {
      return null;
    }
  });
  const keep = useCallback(
    (next: number | null) => {
      setMoment(next);
      try {
        if (next === null) localStorage.removeItem(key);
        else localStorage.setItem(key, String(next));
      } catch {
        // Where nothing can be kept it lasts as long as the screen.
      }
    },
    [key],
  );
  return [moment, keep];
}
