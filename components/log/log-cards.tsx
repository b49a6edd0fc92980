import type { ReactNode } from "react";
import type { LogEntry } from "@/lib/core/contract/log";
import { EntryMore } from "./entry-more";
import { hoursInWords } from "./hours-in-words";
import { Standing } from "./standing";

type Props = { entries: readonly LogEntry[]; caption: string; namesEngine: boolean; dayOf: (entry: LogEntry) => ReactNode };

/** The log on a narrow screen, where a table of eight columns cannot be read: a line of it is a card. */
export function LogCards({ entries, caption, namesEngine, dayOf }: Props) {
  return (
    <ul aria-label={caption} className="divide-y divide-rule">
      {entries.map((entry) => (
        <li key={entry.id} className="grid gap-0.5 py-3">
          <div className="flex min-h-12 flex-wrap items-center justify-between gap-x-3 gap-y-1">
            {dayOf(entry)}
            <Standing entry={entry} />
          </div>
          {namesEngine && (
            <p className="text-sm text-ink-2">
              {entry.boatName}, {entry.engineName}
            </p>
          )}
          <p className="font-semibold">{entry.cause?.title ?? (entry.symptoms.map((s) => s.title).join(", ") || "Nothing named")}</p>
          {entry.remedy && <p>{entry.remedy.title}</p>}
          <p className="text-sm text-ink-2">
            {[
              entry.cause && entry.symptoms.length > 0 ? entry.symptoms.map((s) => s.title).join(", ") : null,
              entry.engineHours === null ? null : `${hoursInWords(entry)} h`,
              entry.minutes === null ? null : `${Math.round(entry.minutes)} min`,
            ]
              .filter((part) => part !== null)
              .join(" · ")}
          </p>
          {entry.outcome !== null && <EntryMore entry={entry} />}
        </li>
      ))}
    </ul>
  );
}
