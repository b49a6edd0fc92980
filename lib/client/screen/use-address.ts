"use client";

import { useCallback, useMemo, useSyncExternalStore } from "react";

/** The screens of the skipper's path. */
export const SCREENS = [
  "engines",
  "say",
  "rules",
  "step",
  "said",
  "change",
  "answered",
  "looked",
  "tried",
  "more",
  "symptoms",
  "outcome",
  "hand-over",
  "ended",
] as const;
export type ScreenName = (typeof SCREENS)[number];

/** Where one is: in the address, so that back, reload and a link sent to oneself all work. */
export type Address = {
  at: ScreenName;
  fleet: string | null;
  engine: string | null;
  /** The diagnosis. */
  d: string | null;
  /** What is changed or looked at: an event's id, or a node's key. */
  which: string | null;
};

const MOVED = "gudgeon:moved";

function watch(notify: () => void): () => void {
  window.addEventListener("popstate", notify);
  window.addEventListener(MOVED, notify);
  return () => {
    window.removeEventListener("popstate", notify);
    window.removeEventListener(MOVED, notify);
  };
}

export function readAddress(search: string): Address {
  const query = new URLSearchParams(search);
  const at = SCREENS.find((screen) => screen === query.get("at"));
  const d = query.get("d");
  const engine = query.get("engine");
  return { at: at ?? (d ? "step" : engine ? "say" : "engines"), fleet: query.get("fleet"), engine, d, which: query.get("which") };
}

export function writeAddress(address: Partial<Address>): string {
  const query = new URLSearchParams();
  for (const key of ["fleet", "engine", "d", "at", "which"] as const) {
    const value = address[key];
    if (value) query.set(key, value);
  }
  const search = query.toString();
  return search ? `/diagnose?${search}` : "/diagnose";
}

/** The address, and a way to another that asks no server: null before the page has woken up. */
export function useAddress(): { address: Address | null; go: (to: Partial<Address>, how?: "push" | "replace") => void } {
  const search = useSyncExternalStore(
    watch,
    () => window.location.search,
    () => null,
  );
  const address = useMemo(() => (search === null ? null : readAddress(search)), [search]);
  const go = useCallback((to: Partial<Address>, how: "push" | "replace" = "push") => {
    const url = writeAddress(to);
    if (how === "push") window.history.pushState(null, "", url);
    else window.history.replaceState(null, "", url);
    window.dispatchEvent(new Event(MOVED));
  }, []);
  return { address, go };
}
