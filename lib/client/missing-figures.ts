import type { EngineProfile } from "@/lib/core/contract/engine";
import type { Check, EngineFigure } from "@/lib/core/tree/schema";

/** Figures of the engine without which this check's reading means nothing, and which nobody has told yet. */
export function missingFigures(check: Check, profile: EngineProfile): EngineFigure[] {
  const needed = (check.reading?.bands ?? []).flatMap(({ from, to }) =>
    [from, to].flatMap((edge) => (typeof edge === "object" && "of" in edge ? [edge.of] : [])),
  );
  return [...new Set(needed)].filter((figure) => profile.figures[figure] === undefined);
}
