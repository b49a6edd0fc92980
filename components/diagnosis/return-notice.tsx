"use client";

import { useState } from "react";
import { durationInWords, minutesBetween } from "@/lib/client/duration";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { useHere } from "./here";

/** After this long an engine has cooled, filled or been worked on: what was found may not hold. */
const STALE_MINUTES = 240;

/** Said once when a diagnosis is taken up again after hours. */
export function ReturnNotice() {
  const { summary, go } = useHere();
  const [away] = useState(() => minutesBetween(summary.touchedAt, Date.now()));
  const [gone, setGone] = useState(false);
  if (away < STALE_MINUTES || gone || summary.answers === 0) return null;
  return (
    <div className="mb-4">
      <Notice tone="look" title={`The last answer is ${durationInWords(away)} old`}>
        <p>Has the engine been run, cooled down or worked on since? Then some answers may have changed.</p>
        <div className="mt-2 flex flex-wrap gap-2">
          <Button onClick={() => go("said")}>Look through the answers</Button>
          <Button tone="quiet" onClick={() => setGone(true)}>
            They still hold
          </Button>
        </div>
      </Notice>
    </div>
  );
}
