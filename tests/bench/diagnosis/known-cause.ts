import type { Model } from "@/lib/core/diagnosis/model";

/**
 * What a fault costs to someone who knows its cause: its remedies in the order
 * of minutes per chance, or a call where that is cheaper. Nobody can do better.
 */
export function minutesIfKnown(model: Model, hypothesis: number): number {
  const curing = model.remedies
    .filter(({ cure, offered }) => offered && cure[hypothesis]! > 0)
    .sort((a, b) => b.minutes / b.cure[hypothesis]! - a.minutes / a.cure[hypothesis]!);
  return curing.reduce((left, { minutes, cure }) => Math.min(left, minutes + (1 - cure[hypothesis]!) * left), model.callMinutes);
}
