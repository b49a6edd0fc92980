"use client";

import { useCallback, useState } from "react";

/** A half-filled form that outlives a reload of the page, until it is given in. */
export function useKeptForm<T extends object>(key: string, initial: () => T): [T, (part: Partial<T>) => void, () => void] {
  const [form, setForm] = useState<T>(() => {
    const fresh = initial();
    try {
      const kept: unknown = JSON.parse(sessionStorage.getItem(key) ?? "null");
      return typeof kept === "object" && kept !== null ? { ...fresh, ...kept } : fresh;
    } catch {
      return fresh;
    }
  });
  const change = useCallback(
    (part: Partial<T>) =>
      setForm((before) => {
        const next = { ...before, ...part };
        try {
          sessionStorage.setItem(key, JSON.stringify(next));
        } catch {
          // Where nothing can be kept it lasts as long as the page.
        }
        return next;
      }),
    [key],
  );
  const drop = useCallback(() => {
    try {
      sessionStorage.removeItem(key);
    } catch {
      // Nothing was kept.
    }
  }, [key]);
  return [form, change, drop];
}
