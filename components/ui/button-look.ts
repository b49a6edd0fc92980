import { clsx } from "clsx";

/** strong: the one thing to do here. plain: another thing. quiet: a way out. grave: takes something away. */
export type Tone = "strong" | "plain" | "quiet" | "grave";
export type Size = "normal" | "large";

const TONES: Record<Tone, string> = {
  strong: "bg-deep text-on-deep border-deep night:border-edge hover:bg-deep-2",
  plain: "bg-sheet text-ink border-edge hover:bg-shoal",
  quiet: "bg-transparent text-ink-2 border-edge border-dashed hover:bg-shoal",
  grave: "bg-sheet text-lead border-lead hover:bg-lead-wash",
};

/** What buttons and links that look like buttons have in common. */
export function buttonLook(tone: Tone, size: Size, wide: boolean, className?: string): string {
  return clsx(
    "inline-flex items-center justify-center gap-2 border-[1.5px] font-semibold no-underline transition-colors",
    "disabled:opacity-60 aria-disabled:opacity-60",
    size === "large" ? "min-h-16 rounded-xl px-5 py-2 text-lg" : "min-h-12 rounded-lg px-4 py-2 text-base",
    wide && "w-full",
    TONES[tone],
    className,
  );
}
