import { clsx } from "clsx";

type Props = { title: string; detail: string; picked: boolean; onToggle: () => void };

export function SymptomRow({ title, detail, picked, onToggle }: Props) {
  return (
    <label
      className={clsx(
        "relative grid min-h-16 grid-cols-[1fr_28px] items-center gap-2 border-b border-rule px-3.5 py-2.5 last:border-b-0",
        "has-focus-visible:outline-3 has-focus-visible:-outline-offset-4 has-focus-visible:outline-brass",
        picked && "bg-shoal",
      )}
    >
      <span>
        <b className="block font-semibold">{title}</b>
        <span className="block text-sm text-ink-2">{detail}</span>
      </span>
      <input type="checkbox" checked={picked} onChange={onToggle} className="absolute inset-0 cursor-pointer opacity-0" />
      {picked ? (
        <svg width={22} height={22} viewBox="0 0 22 22" aria-hidden className="justify-self-end">
          <path d="M4 12l5 5L18 6" fill="none" stroke="var(--fill)" strokeWidth={3} />
        </svg>
      ) : (
        <span aria-hidden className="size-5 justify-self-end rounded border-[1.5px] border-edge" />
      )}
    </label>
  );
}
