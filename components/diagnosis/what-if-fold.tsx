"use client";

import { useState } from "react";
import type { WhatIf } from "@/lib/core/diagnosis/what-if";
import { useHere } from "./here";

/** Behind the step: what would come next on each answer, and which words of the tree the ranking hangs on. */
export function WhatIfFold() {
  const { whatIf } = useHere();
  const [found, setFound] = useState<WhatIf | "looking" | "failed" | null>(null);
  const look = () => {
    if (found !== null) return;
    setFound("looking");
    whatIf().then(setFound, () => setFound("failed"));
  };
  return (
    <details onToggle={(event) => event.currentTarget.open && look()} className="text-sm">
      <summary className="flex min-h-12 items-center font-semibold">What would come next, and what this hangs on</summary>
      <div className="grid gap-2 border-l-2 border-rule pb-2 pl-3" aria-live="polite">
        {found === "looking" && <p>One moment.</p>}
        {found === "failed" && <p>It could not be worked out. The step above stands.</p>}
        {found !== null && typeof found === "object" && <Found {...found} />}
      </div>
    </details>
  );
}

function Found({ next, hangsOn }: WhatIf) {
  return (
    <>
      {next.length > 0 && (
        <dl className="grid gap-1.5">
          {next.map(({ says, then }) => (
            <div key={says}>
              <dt className="text-ink-2">{says}</dt>
              <dd>{then.kind === "rule" ? `A stop rule first: ${then.title}` : then.title}</dd>
            </div>
          ))}
        </dl>
      )}
      {hangsOn.length === 0 ? (
        <p>No single word of the tree, moved by one step, would put another cause first.</p>
      ) : (
        hangsOn.map((says) => <p key={says}>{says}</p>)
      )}
    </>
  );
}
