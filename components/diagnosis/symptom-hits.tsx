import type { Symptom } from "@/lib/core/tree/schema";
import { SymptomRows, type Picking } from "./symptom-rows";

type Props = Picking & {
  symptoms: readonly Symptom[];
  keys: readonly string[];
  said: boolean;
  /** All of them are guesses: the words say none of them. */
  onlyNearest: boolean;
};

/** What the words may mean. What fits is ticked; a tap unticks. Guesses are offered, never ticked. */
export function SymptomHits({ symptoms, keys, isPicked, onToggle, said, onlyNearest }: Props) {
  const found = keys.flatMap((key) => symptoms.filter((symptom) => symptom.key === key));
  return (
    <div aria-live="polite">
      {onlyNearest && found.length > 0 && <p className="mt-3 text-sm">Nothing says just that; nearest:</p>}
      {found.length > 0 && (
        <div className="mt-2.5">
          <SymptomRows symptoms={found} isPicked={isPicked} onToggle={onToggle} />
        </div>
      )}
      {said && !found.some(({ key }) => isPicked(key)) && (
        <p className="mt-3 text-sm">
          {found.length === 0
            ? "Nothing in the tree fits these words well. Pick"
            : "Nothing fits these words well. Tick what is meant, pick"}{" "}
          the nearest from the list below, or go on without: the checks then start wider. Fire, fuel, smoke, steam or an alarm: the next
          screen asks about those first.
        </p>
      )}
    </div>
  );
}
