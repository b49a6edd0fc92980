import type { Symptom } from "@/lib/core/tree/schema";
import { SymptomRow } from "./symptom-row";

export type Picking = { isPicked: (key: string) => boolean; onToggle: (key: string) => void };

/** Symptoms to be ticked, in one frame. */
export function SymptomRows({ symptoms, isPicked, onToggle }: Picking & { symptoms: readonly Symptom[] }) {
  return (
    <div className="overflow-hidden rounded-xl border-[1.5px] border-edge bg-sheet">
      {symptoms.map(({ key, title, detail }) => (
        <SymptomRow key={key} title={title} detail={detail} picked={isPicked(key)} onToggle={() => onToggle(key)} />
      ))}
    </div>
  );
}
