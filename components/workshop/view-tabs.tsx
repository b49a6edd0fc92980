import { clsx } from "clsx";
import { VIEWS, type View } from "./place";

const TITLES: Readonly<Record<View, string>> = {
  graph: "Graph",
  table: "Table",
  try: "Try it",
  prove: "Prove it",
  learn: "Learn",
};

type Props = { here: View; onChoose: (view: View) => void };

/** The ways to look at the draft. */
export function ViewTabs({ here, onChoose }: Props) {
  return (
    <nav aria-label="Ways to look at the draft" className="flex flex-wrap overflow-hidden rounded-lg border-[1.5px] border-on-deep/45">
      {VIEWS.map((view) => (
        <button
          key={view}
          type="button"
          aria-current={view === here ? "page" : undefined}
          onClick={() => onChoose(view)}
          className={clsx(
            "min-h-11 px-3 text-sm font-semibold",
            view === here ? "bg-on-deep/20 underline decoration-2 underline-offset-4" : "",
          )}
        >
          {TITLES[view]}
        </button>
      ))}
    </nav>
  );
}
