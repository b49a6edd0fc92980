"use client";

import { useEffect, useState } from "react";

/** Seconds since `from` (a Date.now() figure), five times a second while it runs; null when it does not. A phone that slept catches up. */
export function useTicking(from: number | null): number | null {
  const [now, setNow] = useState(0);
  useEffect(() => {
    if (from === null) return;
    const tick = () => setNow(Date.now());
    const first = setTimeout(tick, 0);
    const timer = setInterval(tick, 200);
    return () => {
      clearTimeout(first);
      clearInterval(timer);
    };
  }, [from]);
  return from === null ? null : Math.max(0, (now - from) / 1000);
}
