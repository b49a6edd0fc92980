"use client";

import { Moon, Sun } from "lucide-react";
import { useSyncExternalStore } from "react";
import { LIGHT_KEY } from "./light-script";

const CHANGED = "lightchange";

function subscribe(notify: () => void): () => void {
  window.addEventListener(CHANGED, notify);
  window.addEventListener("storage", followOtherTabs);
  return () => {
    window.removeEventListener(CHANGED, notify);
    window.removeEventListener("storage", followOtherTabs);
  };
}

function followOtherTabs(event: StorageEvent): void {
  if (event.key === LIGHT_KEY) show(event.newValue === "night");
}

function show(night: boolean): void {
  if (night) document.documentElement.dataset.light = "night";
  else delete document.documentElement.dataset.light;
  window.dispatchEvent(new Event(CHANGED));
}

/** One tap between day and night light; kept on this device. */
export function LightSwitch({ className = "", compact = false }: { className?: string; compact?: boolean }) {
  const night = useSyncExternalStore(
    subscribe,
    () => document.documentElement.dataset.light === "night",
    () => false,
  );
  const switchOver = () => {
    show(!night);
    try {
      localStorage.setItem(LIGHT_KEY, night ? "day" : "night");
    } catch {
      // A browser that keeps nothing still shows the light until the page is left.
    }
  };
  const Icon = night ? Sun : Moon;
  return (
    <button
      type="button"
      onClick={switchOver}
      className={`inline-flex min-h-12 min-w-12 items-center justify-center gap-2 rounded-lg px-3 text-sm ${className}`}
    >
      <Icon aria-hidden size={20} />
      <span className={compact ? "visually-hidden" : undefined}>{night ? "Day light" : "Night light"}</span>
    </button>
  );
}
