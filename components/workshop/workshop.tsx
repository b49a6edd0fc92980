"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { useWorkbench } from "./use-workbench";
import { Bench } from "./bench";

type Props = { fleetId: string; userId: string; current: TreeVersionInfo; newestShipped: TreeVersionInfo | null };

/** The mechanic's workshop: the fleet's draft, opened or begun from the version in use. */
export function Workshop({ fleetId, userId, current, newestShipped }: Props) {
  const [attempt, setAttempt] = useState(0);
  const opened = useWorkbench(fleetId, userId, current.id, attempt);
  if (opened === null)
    return (
      <p role="status" className="py-8">
        Opening the workshop…
      </p>
    );
  if ("failure" in opened)
    return (
      <div className="grid max-w-xl gap-4 py-6">
        <Notice tone="bad" title="The draft could not be opened" live>
          {opened.failure}
        </Notice>
        <div>
          <Button tone="strong" onClick={() => setAttempt(attempt + 1)}>
            Try again
          </Button>
        </div>
      </div>
    );
  return (
    <Bench
      key={attempt}
      fleetId={fleetId}
      bench={opened.bench}
      current={current}
      newestShipped={newestShipped}
      // The page knows which version is in use now: the next draft must not begin from one that was in use before.
      onGone={() => window.location.reload()}
    />
  );
}
