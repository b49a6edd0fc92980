import type { FaultTree } from "@/lib/core/tree/schema";
import { SymptomRow } from "./symptom-row";

/** All symptoms of the tree, by system. */
export function SymptomList({
  tree,
  isPicked,
  onToggle,
}: {
  tree: FaultTree;
  isPicked: (key: string) => boolean;
  onToggle: (key: string) => void;
}) {
  return (
    <div className="grid gap-4">
      {tree.systems.map((system) => {
        const symptoms = tree.symptoms.filter((symptom) => symptom.system === system.key);
        if (symptoms.length === 0) return null;
        return (
          <section key={system.key} aria-label={system.title}>
            <h3 className="mb-1 text-ink-2">{system.title}</h3>
            <div className="overflow-hidden rounded-xl border-[1.5px] border-edge bg-sheet">
              {symptoms.map((symptom) => (
                <SymptomRow
                  key={symptom.key}
                  title={symptom.title}
                  detail={symptom.detail}
                  picked={isPicked(symptom.key)}
                  onToggle={() => onToggle(symptom.key)}
                />
              ))}
            </div>
          </section>
        );
      })}
    </div>
  );
}
