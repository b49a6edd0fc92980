"use client";

import { useEffect } from "react";

/** Keeps the screen lit while hands are dirty. The phone may refuse, and takes it back when the page is hidden. */
export function useWakeLock(wanted: boolean): void {
  useEffect(() => {
    if (!wanted || !("wakeLock" in navigator)) return;
    let lock: WakeLockSentinel | null = null;
    let ended = false;
    const ask = async () => {
      if (document.visibilityState !== "visible") return;
      try {
        const given = await navigator.wakeLock.request("screen");
        if (ended) await given.release();
        else lock = given;
      } catch {
        // Low battery or not allowed: the screen goes dark as usual.
      }
    };
    void ask();
    document.addEventListener("visibilitychange", ask);
    return () => {
      ended = true;
      document.removeEventListener("visibilitychange", ask);
      void lock?.release();
    };
  }, [wanted]);
}
