import { clsx } from "clsx";
import type { ReactNode } from "react";

export type SignalWord = "danger" | "warning" | "caution" | "notice";

/** DANGER will kill or maim, WARNING could, CAUTION could injure or damage; NOTICE is about the engine alone and has no triangle. */
export function CautionPanel({ signal, children }: { signal: SignalWord; children: ReactNode }) {
  const grave = signal === "danger" || signal === "warning";
  return (
    <div
      className={clsx(
        "flex gap-2.5 rounded-lg border-[1.5px] px-3 py-2.5 text-sm",
        grave ? "border-lead bg-lead-wash" : signal === "caution" ? "border-buoy bg-buoy-wash" : "border-edge bg-sheet",
        signal === "danger" && "border-[3px]",
      )}
    >
      {signal !== "notice" && <Triangle grave={grave} />}
      <p>
        <b className={clsx("tracking-[0.03em]", grave ? "text-lead" : signal === "caution" ? "text-buoy" : "text-ink")}>
          {signal.toUpperCase()}
        </b>{" "}
        {children}
      </p>
    </div>
  );
}

function Triangle({ grave }: { grave: boolean }) {
  const colour = grave ? "var(--lead)" : "var(--buoy)";
  return (
    <svg className="mt-0.5 flex-none" width={24} height={22} viewBox="0 0 24 22" aria-hidden focusable="false">
      <path d="M12 1 23 21H1Z" fill="none" stroke={colour} strokeWidth={2} strokeLinejoin="round" />
      <path d="M12 8v6M12 17v1.6" stroke={colour} strokeWidth={2.4} />
    </svg>
  );
}
