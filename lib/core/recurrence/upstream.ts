import type { Strength } from "../tree/finding-link";
import { STRENGTHS } from "../tree/strength";
import type { FaultTree } from "../tree/schema";
import type { Upstream } from "./came-back";

/** What the tree says lies upstream of its causes (rule B5): causes that bring one on, likeliest first, then roots in words. */
export function upstreamIn(tree: Pick<FaultTree, "causes">): (cause: string) => Upstream {
  const byKey = new Map(tree.causes.map((cause) => [cause.key, cause]));
  return (key) => {
    const cause = byKey.get(key);
    if (!cause) return [];
    const linked = Object.entries(cause.broughtOnBy)
      .map(([upstream, strength]) => ({ cause: upstream, title: byKey.get(upstream)?.title ?? upstream, share: shareOf(strength) }))
      .sort((a, b) => b.share - a.share || (a.cause < b.cause ? -1 : 1));
    return [...linked, ...cause.roots.map((title) => ({ cause: null, title, share: null }))];
  };
}

const shareOf = (strength: Strength) => (typeof strength === "number" ? strength : STRENGTHS[strength]);
