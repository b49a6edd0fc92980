"use client";

import { ChevronLeft } from "lucide-react";
import { useHere } from "./here";

/** Back to the step that is due; the phone's own back does as well. */
export function BackLink() {
  const { go } = useHere();
  return (
    <button type="button" className="link no-print mb-1 -ml-1 inline-flex min-h-12 items-center gap-1" onClick={() => go("step")}>
      <ChevronLeft aria-hidden size={20} />
      Back to the step
    </button>
  );
}
