"use client";

import { useCallback, useEffect, useState } from "react";
import { TapGuard } from "../tap-guard";

/** One for the page: a bounce does not care which screen it lands on. */
const taps = new TapGuard();

/** Does the work of a tap unless it is the bounce of the one before on the same control. */
export function useGuard(): (on: string, work: () => void) => void {
  return useCallback((on, work) => {
    if (taps.allows(on, performance.now())) work();
  }, []);
}

/** True while what has just come onto the screen may still be under a bouncing finger. */
export function useSettling(): boolean {
  const [settling, setSettling] = useState(() => taps.settlesIn(performance.now()) > 0);
  useEffect(() => {
    const timer = setTimeout(() => setSettling(false), taps.settlesIn(performance.now()));
    return () => clearTimeout(timer);
  }, []);
  return settling;
}
