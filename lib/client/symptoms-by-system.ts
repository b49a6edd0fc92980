import { probabilityOf } from "@/lib/core/diagnosis/cause-row";
import type { FaultTree, Symptom } from "@/lib/core/tree/schema";
import { BASE_RATES } from "@/lib/core/tree/strength";

/** From this share of what brings a symptom on, people look for it under that system. */
const LOOKED_FOR = 0.15;

/** The symptoms under each system: its own, and those that a good part of the time come from it. Whoever suspects the fuel finds them under fuel. */
export function symptomsBySystem(tree: FaultTree): { key: string; title: string; symptoms: Symptom[] }[] {
  const shares = new Map(tree.symptoms.map(({ key }) => [key, systemShares(tree, key)]));
  return tree.systems
    .map(({ key, title }) => ({
      key,
      title,
      symptoms: tree.symptoms.filter((symptom) => symptom.system === key || (shares.get(symptom.key)?.get(key) ?? 0) >= LOOKED_FOR),
    }))
    .filter(({ symptoms }) => symptoms.length > 0);
}

/** How much of a symptom each system brings on, by base rate and strength. */
function systemShares(tree: FaultTree, symptom: string): Map<string, number> {
  const weights = new Map<string, number>();
  let all = 0;
  for (const { system, base, shows } of tree.causes) {
    const strength = shows[symptom];
    if (strength === undefined) continue;
    const weight = (typeof base === "number" ? base : BASE_RATES[base]) * probabilityOf(strength);
    weights.set(system, (weights.get(system) ?? 0) + weight);
    all += weight;
  }
  return new Map([...weights].map(([system, weight]) => [system, weight / all]));
}
