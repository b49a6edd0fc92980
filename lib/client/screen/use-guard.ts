"use client";

import { useCallback, useRef } from "react";

/** A finger that bounces in a seaway taps twice within this. */
const GUARD_MS = 400;

/** Lets one tap through and drops those that follow within the guard, over all the buttons that share it. */
export function useGuard(): (work: () => void) => void {
  const last = useRef(-Infinity);
  return useCallback((work: () => void) => {
    const now = performance.now();
    if (now - last.current < GUARD_MS) return;
    last.current = now;
    work();
  }, []);
}
