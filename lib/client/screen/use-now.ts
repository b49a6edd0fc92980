"use client";

import { useEffect, useState } from "react";

/** The time, renewed every so many seconds; 0 in the first paint, which the server and the phone must draw alike. */
export function useNow(everySeconds = 20): number {
  const [now, setNow] = useState(0);
  useEffect(() => {
    const tick = () => setNow(Date.now());
    const first = setTimeout(tick, 0);
    const timer = setInterval(tick, everySeconds * 1000);
    return () => {
      clearTimeout(first);
      clearInterval(timer);
    };
  }, [everySeconds]);
  return now;
}
