"use client";

import { CauseRow } from "./cause-row";
import { useHere } from "./here";
import { Swatch, type Pattern } from "./swatch";
import { Ticks } from "./ticks";
import { TwoFaults } from "./two-faults";
import { WhatIfFold } from "./what-if-fold";

/** How many causes stand in the open; the rest is folded. */
const IN_THE_OPEN = 3;
const PATTERNS: readonly Pattern[] = ["solid", "hatched", "barred"];

/** What is still possible, as counts of 100 engines like this one. */
export function StillPossible() {
  const { view } = useHere();
  const { causes, others, unknown } = view.possible;
  const open = causes.slice(0, IN_THE_OPEN);
  const folded = causes.slice(IN_THE_OPEN);
  const foldedOf100 = folded.reduce((sum, { of100 }) => sum + of100, others.of100);
  const foldedCount = folded.length + others.count;
  const pattern = (index: number): Pattern => PATTERNS[index] ?? "pale";
  return (
    <section aria-labelledby="still-possible">
      <div className="mb-1.5 flex flex-wrap justify-between gap-x-3 text-sm text-ink-2">
        <h2 id="still-possible" className="text-sm font-bold tracking-normal">
          Still possible
        </h2>
        <span>
          of <span className="dial">100</span> engines like this
        </span>
      </div>
      <Ticks
        runs={[
          ...open.map((cause, index) => ({ pattern: pattern(index), count: cause.of100 })),
          { pattern: "pale", count: foldedOf100 },
          { pattern: "empty", count: unknown.of100 },
        ]}
      />
      <TwoFaults />
      {open.map((cause, index) => (
        <CauseRow key={cause.key} cause={cause} pattern={pattern(index)} />
      ))}
      {foldedCount > 0 && (
        <details>
          <summary className="grid min-h-12 grid-cols-[1fr_44px_20px] items-center gap-2.5 text-sm">
            <span>
              <Swatch pattern="pale" />
              {foldedCount === 1 ? "One other" : `${foldedCount} others`}
            </span>
            <span className="dial text-right">{foldedOf100}</span>
          </summary>
          <div className="border-l-2 border-rule pl-3">
            {folded.map((cause) => (
              <CauseRow key={cause.key} cause={cause} pattern="pale" />
            ))}
            {others.count > 0 && (
              <p className="py-2 text-sm text-ink-2">
                {others.count} more, together {others.of100} of 100. Unlikely, not ruled out.
              </p>
            )}
          </div>
        </details>
      )}
      <div className="grid min-h-12 grid-cols-[1fr_44px_20px] items-center gap-2.5 text-sm">
        <span>
          <Swatch pattern="empty" />
          Something not in this tree
        </span>
        <span className="dial text-right">{unknown.of100}</span>
      </div>
      <p className="mt-1 text-sm text-ink-2">{view.possible.sure}</p>
      {view.step && <WhatIfFold key={`${view.step.key} ${view.said.length}`} />}
    </section>
  );
}
