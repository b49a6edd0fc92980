import type { PassageLine } from "./passage-plan";

export type Confidence = "at90" | "at95" | "at99";

/** One part to buy for a boat. `driver`: the figure that makes the number what it is. */
export type ToBuy = {
  readonly part: string;
  readonly title: string;
  readonly carry: number;
  readonly aboard: number;
  readonly buy: number;
  readonly driver: string;
};

/**
 * What is missing aboard one boat: the number to carry at the chosen confidence, or the owner's own minimum where that is more, less what is
 * there (rule P6).
 */
export function shoppingList(
  plan: readonly PassageLine[],
  confidence: Confidence,
  minimums: ReadonlyMap<string, { title: string; minimum: number; aboard: number }> = new Map(),
): ToBuy[] {
  const planned = new Map(plan.map((line) => [line.part, line]));
  const parts = new Set([...planned.keys(), ...minimums.keys()]);
  return [...parts]
    .flatMap((part) => {
      const line = planned.get(part);
      const kept = minimums.get(part);
      const needed = line?.carry[confidence] ?? 0;
      const carry = Math.max(needed, kept?.minimum ?? 0);
      const aboard = line?.aboard ?? kept?.aboard ?? 0;
      if (carry <= aboard) return [];
      const driver = needed >= (kept?.minimum ?? 0) ? (line?.reasons[0]?.words ?? "") : `Your own minimum of ${kept?.minimum ?? 0}`;
      return [{ part, title: line?.title ?? kept?.title ?? part, carry, aboard, buy: carry - aboard, driver }];
    })
    .sort((a, b) => b.buy - a.buy || (a.title < b.title ? -1 : 1));
}
