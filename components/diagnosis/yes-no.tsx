import { clsx } from "clsx";

type Props = { label: string; value: "yes" | "no" | null; onAnswer: (answer: "yes" | "no") => void };

/** Two big buttons, spelled out. The one that was chosen says so in words to a screen reader. */
export function YesNo({ label, value, onAnswer }: Props) {
  return (
    <div role="group" aria-label={label} className="grid grid-cols-2 gap-3">
      {(["yes", "no"] as const).map((answer) => (
        <button
          key={answer}
          type="button"
          aria-pressed={value === answer}
          onClick={() => onAnswer(answer)}
          className={clsx(
            "min-h-16 rounded-[10px] border-[1.5px] text-lg font-semibold",
            value === answer
              ? "border-deep bg-deep text-on-deep underline underline-offset-4 night:border-edge"
              : "border-edge bg-paper hover:bg-shoal",
          )}
        >
          {answer === "yes" ? "Yes" : "No"}
        </button>
      ))}
    </div>
  );
}
