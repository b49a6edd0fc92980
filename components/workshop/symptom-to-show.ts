import { probabilityOf } from "@/lib/core/diagnosis/cause-row";
import type { ListName } from "@/lib/core/tree/flaw";
import type { Cause, FaultTree } from "@/lib/core/tree/schema";

/** The symptom in whose part a node that was found can be seen: null where it stands in the part that is drawn, or in none. */
export function symptomToShow(tree: FaultTree, { list, key }: { list: ListName; key: string }, here: string): string | null {
  if (list === "symptoms") return key === here ? null : key;
  const causes = causesAround(tree, list, key);
  if (causes.length === 0 || causes.some(({ shows }) => shows[here] !== undefined)) return null;
  const [first] = causes;
  const shown = Object.entries(first?.shows ?? {}).sort((a, b) => probabilityOf(b[1]) - probabilityOf(a[1]));
  return shown[0]?.[0] ?? null;
}

/** The causes that a node is drawn with. */
function causesAround(tree: FaultTree, list: ListName, key: string): readonly Cause[] {
  if (list === "causes") return tree.causes.filter((cause) => cause.key === key);
  if (list === "checks") return tree.causes.filter(({ gives }) => gives[key] !== undefined);
  if (list === "remedies") return tree.causes.filter(({ curedBy }) => curedBy[key] !== undefined);
  return [];
}
