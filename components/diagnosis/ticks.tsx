import { clsx } from "clsx";
import { PATTERN_LOOK, type Pattern } from "./swatch";

/** One tick an engine, 100 in all. For eyes only: the rows beneath say the same in figures. */
export function Ticks({ runs }: { runs: readonly { pattern: Pattern; count: number }[] }) {
  const ticks = runs.flatMap(({ pattern, count }) => Array.from({ length: count }, () => pattern));
  return (
    <div aria-hidden className="mt-1 mb-2 grid grid-cols-[repeat(50,1fr)] gap-0.5">
      {ticks.map((pattern, index) => (
        <i key={index} className={clsx("h-[13px] rounded-[1px]", PATTERN_LOOK[pattern])} />
      ))}
    </div>
  );
}
