import { clsx } from "clsx";
import type { ReactNode } from "react";

export type ChipTone = "sound" | "buoy" | "lead" | "quiet" | "on-deep";

const TONES: Record<ChipTone, string> = {
  sound: "bg-sound-wash text-sound border-transparent night:border-sound",
  buoy: "bg-buoy-wash text-buoy border-transparent night:border-buoy",
  lead: "bg-lead-wash text-lead border-transparent night:border-lead",
  quiet: "bg-transparent text-ink-2 border-rule",
  "on-deep": "bg-transparent text-on-deep border-on-deep/45 font-normal",
};

/** A word or two about how something stands. The words carry it; colour repeats it. */
export function Chip({ tone = "quiet", children }: { tone?: ChipTone; children: ReactNode }) {
  return (
    <span className={clsx("inline-block rounded-full border px-2.5 py-0.5 text-sm font-semibold whitespace-nowrap", TONES[tone])}>
      {children}
    </span>
  );
}
