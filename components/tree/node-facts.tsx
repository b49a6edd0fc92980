import type { ReactNode } from "react";
import { sourceKey, type TreePart } from "./tree-part";

/** A heading and what hangs under it; nothing where there is nothing. */
export function Facts({ title, items }: { title: string; items: readonly ReactNode[] }) {
  if (items.length === 0) return null;
  return (
    <section className="mt-4">
      <h3 className="text-sm font-normal text-ink-2">{title}</h3>
      <ul className="divide-y divide-rule">
        {items.map((item, i) => (
          <li key={i} className="py-1.5">
            {item}
          </li>
        ))}
      </ul>
    </section>
  );
}

/** Two words at the ends of a line: what, and how often. */
export function Pair({ what, how }: { what: ReactNode; how: ReactNode }) {
  return (
    <span className="flex flex-wrap justify-between gap-x-4">
      <span>{what}</span>
      <b className="font-semibold text-fill night:text-ink">{how}</b>
    </span>
  );
}

export function Sources({ citations, part }: { citations: readonly string[]; part: TreePart }) {
  const lines = citations.map((citation) => {
    const key = sourceKey(citation);
    const where = citation.slice(key.length).trim();
    const title = part.sources[key] ?? key;
    return where ? `${title}, ${where}` : title;
  });
  return <Facts title="Sources" items={lines} />;
}
