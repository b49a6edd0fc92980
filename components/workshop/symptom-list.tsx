import { clsx } from "clsx";
import type { FaultTree } from "@/lib/core/tree/schema";

type Props = { tree: FaultTree; here: string; onChoose: (key: string) => void };

/** The tree's symptoms, each with the number of causes that show it; one of them is drawn at a time. */
export function SymptomList({ tree, here, onChoose }: Props) {
  const counts = new Map<string, number>();
  for (const cause of tree.causes) for (const key of Object.keys(cause.shows)) counts.set(key, (counts.get(key) ?? 0) + 1);
  return (
    <nav aria-label="Symptoms" className="flex min-h-0 flex-col">
      <p className="px-2 text-sm text-ink-2">Showing what hangs on</p>
      <ul className="max-h-72 overflow-y-auto lg:max-h-none">
        {tree.symptoms.map(({ key, title }) => (
          <li key={key}>
            <button
              type="button"
              aria-current={key === here ? "true" : undefined}
              onClick={() => onChoose(key)}
              className={clsx(
                "flex min-h-12 w-full items-center justify-between gap-3 rounded-lg px-2 text-left text-sm",
                key === here ? "bg-shoal font-semibold night:border night:border-rule" : "hover:bg-shoal",
              )}
            >
              <span>{title}</span>
              <span className="dial">{counts.get(key) ?? 0}</span>
            </button>
          </li>
        ))}
      </ul>
    </nav>
  );
}
