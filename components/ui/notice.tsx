import { clsx } from "clsx";
import type { ReactNode } from "react";

type Props = {
  tone?: "plain" | "good" | "look" | "bad";
  title?: ReactNode;
  children?: ReactNode;
  /** Said by a screen reader when it appears. */ live?: boolean;
};

const TONES = {
  plain: "border-edge bg-sheet",
  good: "border-sound bg-sound-wash",
  look: "border-buoy bg-buoy-wash",
  bad: "border-lead bg-lead-wash",
} as const;

/** Something a person should know about what they see or just did. */
export function Notice({ tone = "plain", title, children, live = false }: Props) {
  return (
    <div
      role={live ? (tone === "bad" ? "alert" : "status") : undefined}
      className={clsx("rounded-lg border-[1.5px] px-3 py-2.5", TONES[tone])}
    >
      {title && <p className="font-semibold">{title}</p>}
      {children && <div className="text-sm">{children}</div>}
    </div>
  );
}
