"use client";

import { useCallback, useEffect, useRef } from "react";
import type { Ask, Told } from "@/lib/client/workshop/protocol";

type Unnumbered<T> = T extends Ask ? Omit<T, "id"> : never;

/** A worker of the workshop's own; what it tells of a question that is no longer the newest is not heard. */
export function useWorker(hear: (told: Told) => void): (ask: Unnumbered<Ask>) => void {
  const worker = useRef<Worker | null>(null);
  const asked = useRef(0);
  const listener = useRef(hear);
  useEffect(() => {
    listener.current = hear;
  }, [hear]);
  useEffect(() => {
    const made = new Worker(new URL("../../lib/client/workshop/workshop-worker.ts", import.meta.url), { type: "module" });
    made.onmessage = ({ data }: MessageEvent<Told>) => {
      if (data.id === asked.current) listener.current(data);
    };
    worker.current = made;
    return () => made.terminate();
  }, []);
  return useCallback((ask) => worker.current?.postMessage({ ...ask, id: ++asked.current } as Ask), []);
}
