import type { Cause } from "../tree/schema";
import { probabilityOf } from "./cause-row";

/** A cause without a link to a symptom shows it 1 time in 1 000. */
const UNLINKED = 0.001;
/** Together such causes hold no more than this after the symptom. */
const UNLINKED_MOST = 0.05;

/**
 * How often each cause shows a symptom. Rules [S1], [S2], [R1].
 *
 * @param weights base weights of the causes, for this engine.
 * @returns shares in the order of the causes, and by how much the unlinked ones had to be held down (1: not at all).
 */
export function symptomShares(
  symptom: string,
  causes: readonly Cause[],
  weights: Float64Array,
): { shares: Float64Array; heldDown: number } {
  const shares = Float64Array.from(causes, (cause, index) => {
    const strength = cause.shows[symptom];
    if (strength === undefined) return UNLINKED;
    return Math.max(UNLINKED, probabilityOf(strength) * shareNotBehind(cause, symptom, causes, weights[index] ?? 0, weights));
  });
  let linked = 0;
  let unlinked = 0;
  causes.forEach((cause, index) => {
    const mass = (weights[index] ?? 0) * (shares[index] ?? 0);
    if (cause.shows[symptom] === undefined) unlinked += mass;
    else linked += mass;
  });
  const most = (UNLINKED_MOST / (1 - UNLINKED_MOST)) * linked;
  const heldDown = linked > 0 && unlinked > most ? most / unlinked : 1;
  if (heldDown < 1) causes.forEach((cause, index) => cause.shows[symptom] === undefined && (shares[index] = UNLINKED * heldDown));
  return { shares, heldDown };
}

/**
 * A root that shows a symptom only through a nearer cause stands behind that
 * cause and is no rival of it. What is left is the share of the root's cases
 * that do not run through a nearer cause which shows the same symptom:
 * P(nearer given root) = P(root given nearer) x weight of nearer / weight of root. Rule [R1].
 */
function shareNotBehind(root: Cause, symptom: string, causes: readonly Cause[], weight: number, weights: Float64Array): number {
  let through = 0;
  causes.forEach((nearer, index) => {
    const strength = nearer.broughtOnBy[root.key];
    if (strength === undefined || nearer.shows[symptom] === undefined || Object.keys(nearer.curedBy).length === 0) return;
    through += (probabilityOf(strength) * (weights[index] ?? 0)) / weight;
  });
  return Math.max(0, 1 - through);
}
