"use client";

import { useCallback, useState } from "react";
import { readKept, withKept, type KeptChanges } from "../kept-changes";

type Follows<T> = { basis: string; fields: readonly (keyof T)[] };

/** A half-filled form that outlives a reload, and the phone's ending the page in a pocket, until it is given in or dropped. */
export function useKeptForm<T extends object>(
  key: string,
  initial: () => T,
  follows?: Follows<T>,
): [T, (part: Partial<T>) => void, () => void] {
  const basis = follows?.basis ?? "";
  const [{ form }, setKept] = useState<{ form: T; changes: KeptChanges["changes"] }>(() => {
    const fresh = initial();
    const form = withKept(fresh, readKept(read(key)), basis, follows?.fields ?? []);
    return { form, changes: Object.fromEntries(Object.entries(form).filter(([name, value]) => fresh[name as keyof T] !== value)) };
  });
  const change = useCallback(
    (part: Partial<T>) =>
      setKept((before) => {
        const changes = { ...before.changes, ...part };
        write(key, JSON.stringify({ basis, changes } satisfies KeptChanges));
        return { form: { ...before.form, ...part }, changes };
      }),
    [key, basis],
  );
  const drop = useCallback(() => write(key, null), [key]);
  return [form, change, drop];
}

/** Where nothing can be kept a form lasts as long as the page. */
function read(key: string): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}

function write(key: string, text: string | null): void {
  try {
    if (text === null) localStorage.removeItem(key);
    else localStorage.setItem(key, text);
  } catch {
    // As above.
  }
}
