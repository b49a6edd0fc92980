import { Card } from "@/components/ui/card";
import type { LogEntry } from "@/lib/core/contract/log";
import { Standing } from "./standing";

/** How a diagnosis ended, all of it. */
export function OutcomeCard({ entry }: { entry: LogEntry }) {
  const rows: [string, string | null][] = [
    ["Found", entry.cause?.title ?? null],
    ["Cured by", entry.remedy?.title ?? null],
    ["Proved", entry.proof ?? (entry.outcome === "cured" ? "Not proved" : null)],
    ["Engine hours", entry.engineHours === null ? null : `${entry.hoursAreEstimated ? "about " : ""}${Math.round(entry.engineHours)} h`],
    ["Minutes", entry.minutes === null ? null : `${Math.round(entry.minutes)}`],
    ["Parts used", entry.parts.map((p) => (p.quantity === 1 ? p.title : `${p.quantity} × ${p.title}`)).join(", ") || null],
    ["Note", entry.note],
    ["This cause on this engine", entry.timesHere > 1 ? `the ${ordinal(entry.timesHere)} time` : null],
  ];
  return (
    <Card aria-labelledby="outcome">
      <div className="flex flex-wrap items-center gap-3">
        <h2 id="outcome">Outcome</h2>
        <Standing entry={entry} />
      </div>
      <dl className="mt-2 grid gap-x-4 gap-y-1 sm:grid-cols-[12rem_1fr]">
        {rows
          .filter((row): row is [string, string] => row[1] !== null)
          .map(([title, says]) => (
            <div key={title} className="contents">
              <dt className="text-ink-2">{title}</dt>
              <dd className="mb-1 whitespace-pre-line sm:mb-0">{says}</dd>
            </div>
          ))}
      </dl>
    </Card>
  );
}

const ordinal = (n: number) => `${n}${n % 100 >= 11 && n % 100 <= 13 ? "th" : (["th", "st", "nd", "rd"][n % 10] ?? "th")}`;
