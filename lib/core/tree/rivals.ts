import { symptomShares } from "../diagnosis/symptom-shares";
import { engineKinds, fits, type EngineKind } from "./engine-kinds";
import type { Cause, FaultTree, Symptom } from "./schema";
import { BASE_RATES } from "./strength";

/** From this share after a symptom a cause is one that a mechanic has in mind. */
const IN_MIND = 0.02;

/** Two causes that have to be told apart: after this symptom, on an engine of this kind, both are in mind. `a` comes before `b` in the tree. */
export type Rivals = { a: Cause; b: Cause; symptom: Symptom; kind: EngineKind };

/**
 * All likely rivals of a tree: pairs of causes with a link to one symptom that
 * each hold at least 2 % of what such causes hold after it, on one of the
 * common kinds of engine. Shares as the reasoning has them (rules [B1], [S1],
 * [R1]), from base rates alone. A pair is named once a symptom and a kind.
 */
export function likelyRivals(tree: Pick<FaultTree, "features" | "symptoms" | "causes">): Rivals[] {
  return engineKinds(tree.features).flatMap((kind) => {
    const causes = tree.causes.filter((cause) => fits(cause, kind));
    return tree.symptoms.flatMap((symptom) => {
      const inMind = causesInMind(symptom.key, causes);
      return inMind.flatMap((a, place) => inMind.slice(place + 1).map((b): Rivals => ({ a, b, symptom, kind })));
    });
  });
}

function causesInMind(symptom: string, causes: readonly Cause[]): Cause[] {
  const linked = causes.filter(({ shows }) => shows[symptom] !== undefined);
  const weights = Float64Array.from(linked, ({ base }) => (typeof base === "number" ? base : BASE_RATES[base]));
  const { shares } = symptomShares(symptom, linked, weights);
  const masses = shares.map((share, index) => share * (weights[index] ?? 0));
  const total = masses.reduce((sum, mass) => sum + mass, 0);
  return linked.filter((_, index) => (masses[index] ?? 0) >= IN_MIND * total);
}
