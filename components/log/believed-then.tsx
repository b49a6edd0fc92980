import type { StoryStep } from "@/lib/core/contract/diagnosis";

type Props = Pick<StoryStep, "believed" | "others" | "unknown">;

/** What was held likely after a step: of 100 engines like this with the same answers. */
export function BelievedThen({ believed, others, unknown }: Props) {
  const rows = [
    ...believed.filter(({ of100 }) => of100 > 0).map(({ key, title, of100 }) => ({ key, title, of100, named: true })),
    { key: "others", title: "Other causes", of100: others, named: false },
    { key: "unknown", title: "Something not in this tree", of100: unknown, named: false },
  ].filter(({ of100 }) => of100 > 0);
  return (
    <div>
      <p className="text-sm text-ink-2">Believed then, of 100 engines like this:</p>
      <ul className="mt-1 grid max-w-2xl gap-0.5 text-sm">
        {rows.map(({ key, title, of100, named }) => (
          <li key={key} className="grid grid-cols-[2.5rem_minmax(0,1fr)] items-center gap-x-2 sm:grid-cols-[2.5rem_6rem_minmax(0,1fr)]">
            <span className="dial text-right">{of100}</span>
            <svg
              viewBox="0 0 100 8"
              preserveAspectRatio="none"
              className="order-last col-start-2 h-2 w-full sm:order-none sm:col-start-auto"
              aria-hidden
            >
              <rect width={100} height={8} fill="var(--shoal)" />
              <rect width={of100} height={8} fill={named ? "var(--fill)" : "var(--edge)"} />
            </svg>
            <span className={named ? "" : "text-ink-2"}>{title}</span>
          </li>
        ))}
      </ul>
    </div>
  );
}
