import type { FaultTree } from "@/lib/core/tree/schema";
import type { Pick } from "@/components/form/pick-or-say";

export type RepairChoices = {
  causes: (Pick & { curedBy: string[] })[];
  remedies: (Pick & { proof: string; temporary: boolean; parts: { key: string; title: string; quantity: number }[] })[];
  symptoms: { key: string; title: string }[];
};

/** What of a tree the form for a repair needs: a small part of it. */
export function repairChoices(tree: FaultTree): RepairChoices {
  const system = new Map(tree.systems.map(({ key, title }) => [key, title]));
  return {
    causes: tree.causes.map((cause) => ({
      key: cause.key,
      title: cause.title,
      under: system.get(cause.system) ?? "",
      curedBy: Object.keys(cause.curedBy),
    })),
    remedies: tree.remedies.map((remedy) => ({
      key: remedy.key,
      title: remedy.title,
      under: system.get(remedy.system) ?? "",
      proof: remedy.proof,
      temporary: remedy.temporary === true,
      parts: remedy.parts,
    })),
    symptoms: tree.symptoms.map(({ key, title }) => ({ key, title })),
  };
}
