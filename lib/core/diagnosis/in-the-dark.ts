import type { Candidate } from "./candidates";
import { ExpectedCost } from "./expected-cost";
import type { Model } from "./model";
import type { Option } from "./options";
import { entropyOf } from "./outcomes";

/** From so much that is open, in nats, and while no remedy is likelier than this to cure, it may be dark. */
const OPEN = 1;
const LIKELY = 0.5;
/** No more hypotheses than this, each of at least such a share and together holding so much, can be thought through to the end. */
const FEW = { count: 8, share: 0.01, together: 0.9 };
/** A hypothesis under this share is left out. */
const COUNTED_FROM = 1e-4;

/**
 * While much is open and nothing is likely, no single answer changes what is
 * best to try, and thinking a few steps ahead sees no end: then what tells most
 * for its minutes is asked, as long as there are checks to tell all that is
 * open, and asking them and mending it is cheaper than trying and calling. Rule [N12].
 *
 * @param candidates the most telling for their minutes first.
 * @returns expected minutes of asking on, or null where it is not dark.
 */
export function inTheDark(model: Model, options: readonly Option[], shares: Float64Array, candidates: readonly Candidate[]): number | null {
  const open = entropyOf(shares);
  if (open < OPEN || areFew(shares)) return null;
  const finding = minutesToTell(open, candidates);
  if (finding === Infinity) return null;
  const kept: number[] = [];
  shares.forEach((share, index) => (share >= COUNTED_FROM || index === model.unknownAt) && kept.push(index));
  const weights = Float64Array.from(kept, (index) => shares[index]!);
  const cost = new ExpectedCost(options, model, kept);
  for (let option = 0; option < cost.options.length; option++) if (cost.chanceOf(option, weights) > LIKELY) return null;
  const known = cost.ifKnown();
  let total = 0;
  let mending = 0;
  for (let index = 0; index < weights.length; index++) {
    total += weights[index]!;
    mending += weights[index]! * known[index]!;
  }
  const asking = mending / total + finding;
  return asking < cost.from(weights).minutes ? asking : null;
}

function areFew(shares: Float64Array): boolean {
  let count = 0;
  let together = 0;
  for (const share of shares) {
    if (share < FEW.share) continue;
    count++;
    together += share;
  }
  return count <= FEW.count && together >= FEW.together;
}

/** Minutes of the most telling checks that together tell so many nats, each taken to tell what it would tell now. */
function minutesToTell(nats: number, candidates: readonly Candidate[]): number {
  let left = nats;
  let sum = 0;
  for (const { minutes, information } of candidates) {
    if (information >= left) return sum + (minutes * left) / information;
    sum += minutes;
    left -= information;
  }
  return Infinity;
}
