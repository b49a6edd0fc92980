"use client";

import { Moment } from "@/components/log/moment";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";

/** Whether the server has it yet: always the truth, never a spinner. */
export function SavingWords({ bench }: { bench: Workbench }) {
  const saving = useObservable(bench.saving);
  switch (saving.state) {
    case "saved":
      return (
        <span role="status">
          Saved <Moment at={saving.at} />
        </span>
      );
    case "waiting":
    case "saving":
      return <span role="status">Kept on this device, saving…</span>;
    case "no-signal":
      return <span role="status">No signal: kept on this device, saved when it is back</span>;
    case "signed-out":
      return <span role="alert">You are signed out: kept on this device. Sign in, and it is saved.</span>;
    case "gone":
      return <span role="alert">The draft was published or given up by somebody else. Your last changes are kept on this device.</span>;
    case "refused":
      return (
        <span role="alert" className="font-semibold text-lead">
          Not saved: {saving.because} {saving.errors[0]?.says}
        </span>
      );
  }
}
